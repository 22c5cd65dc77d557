import type { ReactNode } from 'react';
import type { PanelProps } from '../../bench/panel-props.ts';
import { classNames } from '../../ui/class-names.ts';
import { EffectTable } from './EffectTable.tsx';
import { MeasuredActions } from './MeasuredActions.tsx';
import { MeasuredForm } from './MeasuredForm.tsx';
import { MeasuredShelf } from './MeasuredShelf.tsx';
import { MeasuredTable } from './MeasuredTable.tsx';
import { StationList } from './StationList.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface MeasuredBorePanelProps extends PanelProps {
  desk: MeasuredBoreDesk;
  /** Plumb lines of the drawn and the measured bore together: handed in by the page. */
  hang: ReactNode;
}

/** A measured bore held against the drawn one; nothing is changed until it is used. */
export function MeasuredBorePanel({ desk, hang, ...bench }: MeasuredBorePanelProps) {
  const { document, geometry, prediction, unit, selection } = bench;
  const isWide = geometry.layout === 'wide';
  const { proposed } = desk;
  const left = leftZone(geometry);
  return (
    <section aria-label="Measured bore">
      <MeasuredShelf {...bench} desk={desk} />
      <div className={classNames('grid grid-cols-1', !isWide && 'pb-18')}>
        <div
          className={classNames('z-10 min-w-0 pt-2 pb-6', left.isBeside && 'col-start-1 row-start-1')}
          data-zone="left"
          tabIndex={-1}
          style={left.style}
        >
          <MeasuredForm document={document} unit={unit} isWide={isWide} desk={desk} />
          <Figures {...{ document, unit }} drawn={prediction} desk={desk} />
        </div>
        <div className={classNames('min-w-0', left.isBeside && 'col-start-1 row-start-1')}>
          {hang}
          {proposed !== null && (
            <MeasuredTable
              {...{ document, geometry, unit, selection, proposed }}
              drawn={prediction}
              measured={desk.prediction}
            />
          )}
          {geometry.layout === 'phone' && (
            // The header has no room for them there.
            <div className="flex flex-wrap gap-2 p-4">
              <MeasuredActions desk={desk} />
            </div>
          )}
        </div>
      </div>
    </section>
  );
}

/** Row labels of the figures under the holes begin so far left of the columns, px. */
const LABELS_PX = 124;
const WIDEST_FORM_PX = 490;
/** With less room beside the labels the form stands above the columns, px. */
const LEAST_FORM_PX = 290;

function leftZone({ layout, measures, labelRight }: PanelProps['geometry']) {
  const { x } = measures.leftZone;
  const room = labelRight - LABELS_PX - x;
  const isBeside = (layout === 'wide' || layout === 'tablet') && room >= LEAST_FORM_PX;
  const width = { width: Math.min(WIDEST_FORM_PX, room) };
  return { isBeside, style: { marginLeft: x, ...(isBeside ? width : { marginRight: x }) } };
}

interface FiguresProps extends Pick<PanelProps, 'document' | 'unit'> {
  desk: MeasuredBoreDesk;
  drawn: PanelProps['prediction'];
}

function Figures({ document, unit, drawn, desk }: FiguresProps) {
  const { proposed, prediction } = desk;
  if (proposed === null) return null;
  return (
    <>
      <EffectTable document={document} drawn={drawn} measured={prediction} />
      <StationList document={document} unit={unit} stations={proposed.bore.stations} />
    </>
  );
}
