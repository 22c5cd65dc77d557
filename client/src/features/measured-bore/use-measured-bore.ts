import { useDeferredValue, useMemo, useState } from 'react';
import { useSearchParams } from 'react-router';
import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument, Station } from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';
import { wordsFromFoot } from '#shared/document/fault-words.ts';
import { fitStations, type FittedBore } from '#shared/measured-bore/fit-stations.ts';
import { readMeasuredBore, type MeasuredBore } from '#shared/measured-bore/read-measured-bore.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { PredictionOptions } from '../../engine/engine-answers.ts';
import { useStudy } from '../../engine/use-study.ts';
import { useMeasuredSource, type SourceDesk } from './use-measured-source.ts';

export interface MeasuredBoreDesk extends SourceDesk {
  isOpen: boolean;
  /** Opened by hand, not by loading the page: then the focus follows. */
  isJustOpened: boolean;
  open: () => void;
  /** Leaves everything as drawn; the table is kept. */
  putBack: () => void;
  /** Leaves the drawn bore, and shows the measured one over it. */
  closeBeside: () => void;
  /** null while there is no table. */
  measured: MeasuredBore | null;
  fitted: FittedBore | null;
  /** The design with the measured bore; null where that cannot be made. */
  proposed: DesignDocument | null;
  /** Figures of the proposed design; null until they are worked out. */
  prediction: DesignPrediction | null;
  /** The newest figures there are, perhaps of an earlier proposal: they have to look that way. */
  lastPrediction: DesignPrediction | null;
  /** Why the stations cannot be used, in full sentences. */
  refusals: string[];
  use: () => void;
  /** The measured bore over the drawn one, while it is kept beside it. */
  besideStations: readonly Station[] | null;
  /** Words about the bore just used, as long as nothing else was changed; null otherwise. */
  used: { stations: number; name: string } | null;
  takeBack: () => void;
}

/** The address says that the screen is open, so that a reload opens it again. */
const SHOWN = 'measured';

interface Used {
  before: DesignDocument;
  after: DesignDocument;
  name: string;
}

/** A measured bore on the bench: read, held against the drawn one, used as one step, and taken back. */
export function useMeasuredBore(
  props: Pick<PanelProps, 'document' | 'unit' | 'readOnly' | 'onEdit'>,
  designId: number,
  options: PredictionOptions,
): MeasuredBoreDesk {
  const { document, readOnly, onEdit } = props;
  const desk = useMeasuredSource(designId);
  const [isOpen, setOpen] = useShown();
  const [isJustOpened, setJustOpened] = useState(false);
  const [used, setUsed] = useState<Used | null>(null);
  const { measured, fitted } = useReading(document, desk, isOpen);
  const { proposed, faults, ...predicted } = useProposal(document, {
    fitted,
    isOpen,
    options,
    unit: props.unit,
  });
  const close = (isBeside: boolean) => {
    desk.keepBeside(isBeside);
    setOpen(false);
  };
  return {
    ...desk,
    isOpen,
    isJustOpened,
    open: () => {
      setJustOpened(true);
      setOpen(true);
    },
    putBack: () => close(false),
    closeBeside: () => close(true),
    measured,
    fitted,
    proposed,
    ...predicted,
    refusals: refusalsOf(readOnly, measured, fitted).concat(faults),
    use: () => {
      if (proposed === null) return;
      onEdit({ label: 'Use a measured bore', change: () => proposed });
      setUsed({ before: document, after: proposed, name: desk.source.fileName ?? 'the pasted table' });
      close(false);
    },
    besideStations: desk.source.isBeside && !isOpen ? (fitted?.stations ?? null) : null,
    used: used !== null && used.after === document ? usedWords(used) : null,
    takeBack: () => {
      if (used === null) return;
      onEdit({ label: 'Put the drawn bore back', change: () => used.before });
      setUsed(null);
    },
  };
}

const usedWords = ({ after, name }: Used) => ({ stations: after.bore.stations.length, name });

function refusalsOf(
  readOnly: string | null,
  measured: MeasuredBore | null,
  fitted: FittedBore | null,
): string[] {
  const unread = measured?.status === 'refused' ? measured.message : null;
  return [readOnly, unread, fitted?.refusal].filter((message) => typeof message === 'string');
}

interface ProposalSource {
  fitted: FittedBore | null;
  isOpen: boolean;
  options: PredictionOptions;
  unit: PanelProps['unit'];
}

/** The design with the measured bore, what is wrong with it, and its figures. */
function useProposal(document: DesignDocument, { fitted, isOpen, options, unit }: ProposalSource) {
  const proposed = useMemo(() => proposedDocument(document, fitted), [document, fitted]);
  const faults = useMemo(
    () =>
      proposed === null ? [] : documentFaults(proposed, wordsFromFoot(unit)).map(({ message }) => message),
    [proposed, unit],
  );
  const ask = useMemo(
    () => (proposed === null || faults.length > 0 || !isOpen ? null : { document: proposed, options }),
    [proposed, faults, isOpen, options],
  );
  const { answer, isCurrent } = useStudy('prediction', ask);
  return { proposed, faults, prediction: isCurrent ? answer : null, lastPrediction: answer };
}

function useShown(): [boolean, (isShown: boolean) => void] {
  const [search, setSearch] = useSearchParams();
  const setShown = (isShown: boolean) => {
    const next = new URLSearchParams(search);
    if (isShown) next.set(SHOWN, 'open');
    else next.delete(SHOWN);
    setSearch(next, { preventScrollReset: true });
  };
  return [search.get(SHOWN) === 'open', setShown];
}

/** Reading waits while somebody types or drags: a long table takes longer than a key or a frame. */
function useReading(document: DesignDocument, { source }: SourceDesk, isOpen: boolean) {
  const bore = useDeferredValue(document.bore);
  const text = useDeferredValue(isOpen || source.isBeside ? source.text : '');
  const { meaning, fit } = source;
  const measured = useMemo(
    () => (text.trim() === '' ? null : readMeasuredBore(text, { bore }, meaning)),
    [text, bore, meaning],
  );
  const fitted = useMemo(
    () => (measured?.status === 'read' ? fitStations(measured.readings, { bore }, fit) : null),
    [measured, bore, fit],
  );
  return { measured, fitted };
}

function proposedDocument(document: DesignDocument, fitted: FittedBore | null): DesignDocument | null {
  if (fitted?.refusal !== null) return null;
  return { ...document, bore: { stations: fitted.stations } };
}
