import type { ListDesignsQuery } from '#shared/contract/designs.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { classNames } from '../../ui/class-names.ts';
import { sortList, type DesignSort } from './list-address.ts';
import { RackRule } from './RackRule.tsx';
import type { RackScale } from './rack-scale.ts';

interface RackHeadProps {
  list: ListDesignsQuery;
  onChange: (list: ListDesignsQuery) => void;
  scale: RackScale | null;
  unit: LengthUnit;
  drawingRef: (element: HTMLElement | null) => (() => void) | undefined;
}

/** Column heads that sort, and the rule that everything below is drawn to. */
export function RackHead({ list, onChange, scale, unit, drawingRef }: RackHeadProps) {
  const sort = { list, onChange };
  return (
    <div role="rowgroup">
      <div role="row" className="rack-row rack-head border-hair text-label text-ink3 border-b pb-2.5">
        <SortHead {...sort} column="name" area="[grid-area:name]">
          Design
        </SortHead>
        <div role="columnheader" ref={drawingRef} className="min-w-0 [grid-area:draw]">
          <span className="sr-only">Drawn to scale; the rule counts from the foot</span>
          {scale !== null && <RackRule scale={scale} unit={unit} />}
        </div>
        <SortHead {...sort} column="lowest-note" area="[grid-area:low]">
          Lowest note
        </SortHead>
        <div role="columnheader" className="max-desk:sr-only min-h-6 content-center [grid-area:state]">
          Newest revision
        </div>
        <div
          role="columnheader"
          className="max-desk:sr-only min-h-6 content-center text-right [grid-area:first]"
        >
          Furthest 1
        </div>
        <div
          role="columnheader"
          className="max-desk:sr-only min-h-6 content-center text-right [grid-area:second]"
        >
          Furthest 2
        </div>
        <SortHead {...sort} column="changed" area="text-right [grid-area:changed]">
          Changed
        </SortHead>
        <div role="columnheader" className="[grid-area:menu]">
          <span className="sr-only">What can be done</span>
        </div>
      </div>
    </div>
  );
}

interface SortHeadProps {
  list: ListDesignsQuery;
  onChange: (list: ListDesignsQuery) => void;
  column: DesignSort;
  area: string;
  children: string;
}

function SortHead({ list, onChange, column, area, children }: SortHeadProps) {
  const isSorted = list.sort === column;
  const direction = list.order === 'asc' ? 'ascending' : 'descending';
  return (
    <div
      role="columnheader"
      aria-sort={isSorted ? direction : 'none'}
      className={classNames('max-desk:sr-only', area)}
    >
      {/* Where the heads are only read out, the order is chosen beside the find box. */}
      <span className="desk:hidden">{children}</span>
      <button
        type="button"
        onClick={() => onChange(sortList(list, column))}
        className={classNames(
          'max-desk:hidden rounded-chip hover:text-ink min-h-6',
          isSorted && 'text-ink2 font-semibold',
        )}
      >
        {children}
        {isSorted && <span aria-hidden="true">{list.order === 'asc' ? ' ↑' : ' ↓'}</span>}
      </button>
    </div>
  );
}
