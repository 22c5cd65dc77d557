import { Link } from 'react-router';
import type { DesignList, DesignSummary, ListDesignsQuery } from '#shared/contract/designs.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { BobMark } from '../../bench/Bob.tsx';
import { NoteName } from '../../bench/NoteName.tsx';
import { StateTag } from '../../bench/StateDisc.tsx';
import { printWhen } from '../../lib/print-when.ts';
import { classNames } from '../../ui/class-names.ts';
import { useElementWidth } from '../../ui/use-element-width.ts';
import { describeDesign, TEMPERAMENT_WORDS } from './design-words.ts';
import { DesignRowMenu, type RackRefusals } from './DesignRowMenu.tsx';
import { RackDrawing } from './RackDrawing.tsx';
import { RackHead } from './RackHead.tsx';
import { rackScale, type RackScale } from './rack-scale.ts';
import './rack.css';

interface DesignRackProps {
  designs: DesignList['items'];
  list: ListDesignsQuery;
  unit: LengthUnit;
  /** In tune within this many cents, by register. */
  bandCents: readonly number[];
  pathOf: (id: number) => string;
  /** Where choosing one to be compared leads; while none is being chosen a row opens its design. */
  chooseOf?: ((id: number) => string) | undefined;
  /** Where comparing a design with another begins. */
  compareOf: (id: number) => string;
  onChange: (list: ListDesignsQuery) => void;
  /** Why this person may not copy, rename or archive; null when they may. */
  refusals: RackRefusals;
}

/** Every design drawn to one scale, feet to the right, with what is known of its pitch. */
export function DesignRack({ designs, list, unit, bandCents, onChange, ...row }: DesignRackProps) {
  const [drawing, widthPx] = useElementWidth();
  const scale =
    widthPx === null
      ? null
      : rackScale(
          designs.map(({ outline }) => outline),
          widthPx,
        );
  return (
    <div role="table" aria-label="Designs, drawn to one scale, feet to the right">
      <RackHead list={list} onChange={onChange} scale={scale} unit={unit} drawingRef={drawing} />
      <div role="rowgroup">
        {designs.map((design) => (
          <DesignRow key={design.id} design={design} scale={scale} bandCents={bandCents} {...row} />
        ))}
      </div>
    </div>
  );
}

interface DesignRowProps extends Pick<
  DesignRackProps,
  'bandCents' | 'pathOf' | 'chooseOf' | 'compareOf' | 'refusals'
> {
  design: DesignSummary;
  scale: RackScale | null;
}

function DesignRow({ design, scale, bandCents, pathOf, chooseOf = pathOf, ...row }: DesignRowProps) {
  const [first = 0, second = 0] = bandCents;
  return (
    <div
      role="row"
      className="rack-row border-hair hover:bg-sheet has-[a:focus-visible]:bg-sheet max-tablet:py-3 border-b py-4"
    >
      <div role="rowheader" className="min-w-0 [grid-area:name]">
        <Link
          to={chooseOf(design.id)}
          title={design.name}
          className="text-row text-ink line-clamp-2 font-semibold break-words no-underline after:absolute after:inset-0"
        >
          {design.name}
        </Link>
        <p className="text-data text-ink3 mt-1">{describeDesign(design)}</p>
      </div>
      <div role="cell" className="max-tablet:my-2 min-w-0 overflow-hidden [grid-area:draw]">
        {scale !== null && <RackDrawing outline={design.outline} plumb={design.plumb} scale={scale} />}
      </div>
      <div role="cell" className="max-tablet:flex max-tablet:items-baseline max-tablet:gap-2 [grid-area:low]">
        <p className="font-semibold">
          {design.lowestNote === null ? '–' : <NoteName note={design.lowestNote} />}
        </p>
        <p className="text-data text-ink3">
          {TEMPERAMENT_WORDS[design.temperament] ?? design.temperament}, {design.a4Hz}
        </p>
      </div>
      <div role="cell" className="[grid-area:state]">
        <StateTag state={design.state}>{`rev ${design.revisionNumber}`}</StateTag>
        {design.archived && <p className="text-data text-ink3">archived</p>}
      </div>
      <div role="cell" className="desk:text-right [grid-area:first]">
        <Furthest register={1} furthest={design.furthest1} bandCents={first} />
      </div>
      <div role="cell" className="desk:text-right [grid-area:second]">
        <Furthest register={2} furthest={design.furthest2} bandCents={second} />
      </div>
      <div role="cell" className="text-data desk:text-right desk:text-body [grid-area:changed]">
        <span className="desk:block">{design.changedBy.name}</span>{' '}
        <span className="text-data text-ink3">{printWhen(design.changedAt)}</span>
      </div>
      <div role="cell" className="relative -mt-2.5 [grid-area:menu]">
        <DesignRowMenu
          design={design}
          to={pathOf(design.id)}
          compareTo={row.compareOf(design.id)}
          refusals={row.refusals}
        />
      </div>
    </div>
  );
}

interface FurthestProps {
  register: 1 | 2;
  furthest: DesignSummary['furthest1'];
  bandCents: number;
}

/** The note of a register that is furthest from the scale; bold where it lies outside the workshop's band. */
function Furthest({ register, furthest, bandCents }: FurthestProps) {
  if (furthest === null) return <span className="text-ink3 max-desk:hidden">–</span>;
  const isOutside = Math.abs(furthest.cents) > bandCents;
  return (
    <span className={classNames('inline-flex items-center whitespace-nowrap', isOutside && 'font-bold')}>
      <span className="desk:hidden mr-1 inline-flex">
        <BobMark register={register} />
      </span>
      <span className="desk:hidden sr-only">register {register}, </span>
      <span>
        <NoteName note={furthest.note} /> {formatCents(furthest.cents)}
      </span>
    </span>
  );
}
