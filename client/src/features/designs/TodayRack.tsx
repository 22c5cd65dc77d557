import { useId } from 'react';
import { Link } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import { StateTag } from '../../bench/StateDisc.tsx';
import { printWhen } from '../../lib/print-when.ts';
import { Button } from '../../ui/Button.tsx';
import { useElementWidth } from '../../ui/use-element-width.ts';
import { describeDesign } from './design-words.ts';
import { RackDrawing } from './RackDrawing.tsx';
import { RackRule } from './RackRule.tsx';
import { rackScale, type RackScale } from './rack-scale.ts';
import './rack.css';

interface TodayRackProps {
  title: string;
  designs: readonly DesignSummary[];
  unit: LengthUnit;
  bandCents: readonly number[];
  pathOf: (id: number) => string;
}

/** What lies on the bench: drawn to one scale, each with how it hangs and the one verb that takes it up again. */
export function TodayRack({ title, designs, unit, bandCents, pathOf }: TodayRackProps) {
  const id = useId();
  const [drawing, widthPx] = useElementWidth();
  const scale =
    widthPx === null
      ? null
      : rackScale(
          designs.map(({ outline }) => outline),
          widthPx,
        );
  return (
    <section aria-labelledby={id}>
      <div className="today-row items-center pt-3">
        <p className="text-label text-ink3 [grid-area:name]">All drawn to one scale, feet to the right</p>
        <div ref={drawing} className="min-w-0 [grid-area:draw]">
          {scale !== null && <RackRule scale={scale} unit={unit} />}
        </div>
      </div>
      <h2 id={id} className="border-hair text-section mt-4 border-b pb-1 font-semibold">
        {title}
      </h2>
      <ul>
        {designs.map((design, index) => (
          <TodayRow
            key={design.id}
            design={design}
            scale={scale}
            bandCents={bandCents}
            to={pathOf(design.id)}
            isFirst={index === 0}
          />
        ))}
      </ul>
    </section>
  );
}

interface TodayRowProps {
  design: DesignSummary;
  scale: RackScale | null;
  bandCents: readonly number[];
  to: string;
  isFirst: boolean;
}

function TodayRow({ design, scale, bandCents, to, isFirst }: TodayRowProps) {
  return (
    <li className="today-row border-hair border-b py-3">
      <div className="min-w-0 [grid-area:name]">
        <p className="text-row line-clamp-2 font-semibold break-words" title={design.name}>
          {design.name}
        </p>
        <p className="text-data text-ink3">{describeDesign(design)}</p>
      </div>
      <div className="min-w-0 overflow-hidden [grid-area:draw]">
        {scale !== null && <RackDrawing outline={design.outline} plumb={design.plumb} scale={scale} />}
      </div>
      <div className="min-w-0 [grid-area:state]">
        <HowItHangs design={design} bandCents={bandCents} />
        <p className="text-data text-ink3 flex flex-wrap items-center gap-x-2">
          <StateTag state={design.state}>{`rev ${design.revisionNumber}`}</StateTag>
          {printWhen(design.changedAt)}
        </p>
      </div>
      <div className="[grid-area:verb]">
        <Button asChild look={isFirst ? 'go' : 'plain'} className="w-full">
          <Link to={to} aria-label={`Carry on with ${design.name}`}>
            Carry on
          </Link>
        </Button>
      </div>
    </li>
  );
}

/** The note that is furthest out, in words; what else is there to say of a draft is on the bench itself. */
function HowItHangs({ design, bandCents }: Pick<TodayRowProps, 'design' | 'bandCents'>) {
  const ends = [design.furthest1, design.furthest2].map((furthest, index) => ({
    furthest,
    band: bandCents[index] ?? 0,
  }));
  const out = ends.find(
    ({ furthest, band }) => furthest !== null && Math.abs(furthest.cents) > band,
  )?.furthest;
  if (out !== null && out !== undefined)
    return (
      <p className="font-semibold">
        <NoteName note={out.note} /> hangs {formatCents(Math.abs(out.cents)).replace('+', '')} cents{' '}
        {out.cents < 0 ? 'flat' : 'sharp'}
      </p>
    );
  if (design.outline.holes.length === 0) return <p className="font-semibold">No holes yet</p>;
  const isKnown = ends.some(({ furthest }) => furthest !== null);
  return <p className="font-semibold">{isKnown ? 'Every note hangs straight' : 'Not worked out yet'}</p>;
}
