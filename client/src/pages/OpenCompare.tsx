import { useMemo, useState } from 'react';
import { useSearchParams, useParams } from 'react-router';
import { BenchDefs } from '../bench/BenchDefs.tsx';
import { benchFrame, benchGeometry } from '../bench/bench-geometry.ts';
import { fingerHoleView, WHOLE } from '../bench/bench-view.ts';
import { drawnBody, type DrawnBody } from '../bench/drawn-body.ts';
import type { PanelProps } from '../bench/panel-props.ts';
import { useStable } from '../bench/use-stable.ts';
import { readTerms, writeTerms, type CompareTerms } from '../features/compare/compare-address.ts';
import { turned, type Comparison, type ShownSide } from '../features/compare/comparison.ts';
import { ghostCents } from '../features/compare/note-rows.ts';
import { useHeldSpace } from '../features/compare/use-held-space.ts';
import { choosing } from '../features/workbench/choosing.ts';
import { useSelection } from '../features/workbench/use-selection.ts';
import { useSession } from '../lib/session.ts';
import { useUnit } from '../lib/unit.ts';
import { isCompareView } from '../paths.ts';
import { PageTitle } from '../ui/PageTitle.tsx';
import { useElementWidth } from '../ui/use-element-width.ts';
import type { ComparedDraft } from './compared-draft.ts';
import { CompareHead } from './CompareHead.tsx';
import { ComparePanels } from './ComparePanels.tsx';
import { CompareStrip } from './CompareStrip.tsx';
import { useChangeChoice } from './use-change-choice.ts';
import { useComparison } from './use-comparison.ts';

interface OpenCompareProps {
  a: ComparedDraft;
  b: ComparedDraft;
}

const GUESSED_PX = 1440;
const nothing = () => undefined;

/** Both on the bench: the strip on top, below it what the view shows. */
export function OpenCompare({ a, b }: OpenCompareProps) {
  const { view: named } = useParams();
  const view = isCompareView(named) ? named : 'holes';
  const [search, setSearch] = useSearchParams();
  const { workshop } = useSession();
  const unit = useUnit();
  const isSelf = a.design.id === b.design.id;
  const terms = useMemo(() => readTerms(search), [search]);
  const desk = useComparison({ a: a.document, b: b.document, isSelf }, terms, unit);
  const [side, setSide] = useState<ShownSide>('both');
  const shown: ShownSide = useHeldSpace() ? 'a' : side;
  const { comparison } = desk;
  const choice = useChangeChoice(comparison, unit, isSelf);
  const facing = shown === 'a' ? turned(comparison) : comparison;
  const [measure, widthPx] = useElementWidth();
  const geometry = useComparedGeometry(facing, widthPx ?? GUESSED_PX);
  const [selection, select] = useSelection(facing.b.document);
  const ghosts = useMemo(() => (shown === 'both' ? ghostCents(comparison) : undefined), [shown, comparison]);
  const setTerms = useStable((change: Partial<CompareTerms>) =>
    setSearch(writeTerms(search, change), { replace: true, preventScrollReset: true }),
  );
  const bench: PanelProps = {
    document: facing.b.document,
    prediction: facing.b.prediction,
    sensitivities: null,
    unit,
    bandCents: workshop.bandCents,
    readOnly: 'Nothing is changed while two are compared.',
    selection,
    onSelect: useStable(choosing(facing.b.document, selection, select)),
    onEdit: nothing,
    geometry,
  };
  return (
    <>
      <PageTitle>{isSelf ? `${a.design.name}, compared` : `${a.design.name} and ${b.design.name}`}</PageTitle>
      <BenchDefs />
      <CompareHead
        {...{ a, b, isSelf, view, desk, choice, terms, unit, side, geometry }}
        onSide={setSide}
        onTerms={setTerms}
      />
      <div className="bg-bench border-hair sticky top-0 z-20 border-b">
        <div ref={measure} className="relative mx-auto max-w-400">
          <CompareStrip bench={bench} comparison={shown === 'both' ? comparison : null} />
        </div>
      </div>
      <div className="mx-auto max-w-400 pb-10">
        <ComparePanels {...{ a, view, desk, choice, terms, bench, ghosts }} onTerms={setTerms} />
      </div>
    </>
  );
}

/** Below this the finger holes alone fill the bench, px. */
const PHONE_PX = 700;
const TABLET_PX = 1100;
const TABLET_HOLES = 9;

/** One scale for both: columns hang under the holes of the one in hand. */
function useComparedGeometry({ a, b, offsetMm }: Comparison, widthPx: number) {
  const { document } = b;
  const body = useMemo(
    () => bothBodies(drawnBody(a.document), drawnBody(b.document), offsetMm),
    [a.document, b.document, offsetMm],
  );
  const frame = useMemo(() => {
    const isCrowded = widthPx < TABLET_PX && document.holes.length > TABLET_HOLES;
    const view = widthPx < PHONE_PX || isCrowded ? fingerHoleView(document, body) : WHOLE;
    return benchFrame(body, widthPx, view);
  }, [document, body, widthPx]);
  return useMemo(() => benchGeometry(document, frame), [document, frame]);
}

const bothBodies = (a: DrawnBody, b: DrawnBody, offsetMm: number): DrawnBody => ({
  headMm: Math.min(a.headMm + offsetMm, b.headMm),
  footMm: Math.max(a.footMm + offsetMm, b.footMm),
  widestMm: Math.max(a.widestMm, b.widestMm),
});
