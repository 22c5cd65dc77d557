import { z } from 'zod';
import { draftSchema, newerDraftSchema } from '#shared/contract/designs.ts';
import { storedPredictionSchema } from '#shared/contract/prediction.ts';
import { apiRequest } from '../../lib/api-client.ts';
import { ApiProblem, NoLineError } from '../../lib/api-problem.ts';
import type { DraftApi, LoadOutcome, NoLine, PredictOutcome, Refused, SaveOutcome } from './draft-api.ts';

/** Browsers refuse to send more than this once the page is going away, bytes. */
const KEEPALIVE_ROOM = 60_000;

/** The draft of one design over HTTP. */
export function draftRequests(designId: number): DraftApi {
  const path = `/api/designs/${designId}/draft` as const;
  return {
    load: () =>
      outcomeOf<LoadOutcome>(async () => ({
        status: 'loaded',
        draft: await apiRequest({ path, schema: draftSchema }),
      })),
    save: ({ document, version, leaving = false }) =>
      outcomeOf<SaveOutcome>(
        async () => ({
          status: 'saved',
          draft: await apiRequest({
            method: 'PUT',
            path,
            body: { document },
            headers: { 'If-Match': `"${version}"` },
            keepalive: leaving && new Blob([JSON.stringify(document)]).size < KEEPALIVE_ROOM,
            schema: draftSchema,
          }),
        }),
        newerDraftIn,
      ),
    predict: () =>
      outcomeOf<PredictOutcome>(async () => ({
        status: 'predicted',
        stored: await apiRequest({
          method: 'POST',
          path: `${path}/prediction`,
          schema: storedPredictionSchema,
        }),
      })),
  };
}

function newerDraftIn(problem: ApiProblem): SaveOutcome | null {
  const parsed = newerDraftSchema.safeParse(problem.body);
  return parsed.success ? { status: 'newer', newer: parsed.data.newer } : null;
}

async function outcomeOf<Outcome>(
  ask: () => Promise<Outcome>,
  read: (problem: ApiProblem) => Outcome | null = () => null,
): Promise<Outcome | NoLine | Refused> {
  try {
    return await ask();
  } catch (error) {
    if (isSilence(error)) return { status: 'no-line' };
    if (!(error instanceof ApiProblem)) throw error;
    return read(error) ?? { status: 'refused', problem: error.problem };
  }
}

/**
 * Whether asking again later may help: nobody answered, a server in trouble or busy, an answer cut short or given by
 * something between, a sign-in that was put off.
 */
function isSilence(error: unknown): boolean {
  if (error instanceof ApiProblem) return error.status >= 500 || [401, 408, 429].includes(error.status);
  return error instanceof NoLineError || error instanceof SyntaxError || error instanceof z.ZodError;
}
