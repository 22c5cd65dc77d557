import type { Draft } from '#shared/contract/designs.ts';
import type { StoredPrediction } from '#shared/contract/prediction.ts';
import type { Problem } from '#shared/contract/problem.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';

/** Nobody answered: the line is down, or the workshop's server is. Worth trying again. */
export interface NoLine {
  status: 'no-line';
}

/** An answer that will be the same when asked again. */
export interface Refused {
  status: 'refused';
  problem: Problem;
}

export type LoadOutcome = { status: 'loaded'; draft: Draft } | NoLine | Refused;
export type SaveOutcome =
  { status: 'saved'; draft: Draft } | { status: 'newer'; newer: Draft } | NoLine | Refused;
export type PredictOutcome = { status: 'predicted'; stored: StoredPrediction } | NoLine | Refused;

export interface SaveRequest {
  document: DesignDocument;
  /** The version that the document builds on. */
  version: number;
  /** The page is going away: the request has to outlive it. */
  leaving?: boolean;
}

/** What the draft needs of the server; outcomes instead of errors, so that none is forgotten. */
export interface DraftApi {
  load: () => Promise<LoadOutcome>;
  save: (request: SaveRequest) => Promise<SaveOutcome>;
  predict: () => Promise<PredictOutcome>;
}
