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
  const { layout, measures } = geometry;
  const isWide = layout === 'wide';
  const isBeside = isWide || layout === 'tablet';
  const { proposed } = desk;
  return (
    <section aria-label="Measured bore">
      <MeasuredShelf {...bench} desk={desk} />
      <div className={classNames('grid', !isWide && 'pb-18')}>
        <div
          className={classNames('z-10 pt-2 pb-6', isBeside && 'col-start-1 row-start-1')}
          data-zone="left"
          tabIndex={-1}
          style={{
            marginLeft: measures.leftZone.x,
            ...(isBeside
              ? { width: isWide ? 516 : measures.leftZone.width }
              : { marginRight: measures.leftZone.x }),
          }}
        >
          <MeasuredForm document={document} unit={unit} isWide={isWide} desk={desk} />
          <Figures {...{ document, unit }} drawn={prediction} desk={desk} />
          {layout === 'phone' && (
            <div className="border-hair mt-3 flex flex-wrap gap-2 border-t pt-3">
              <MeasuredActions desk={desk} />
            </div>
          )}
        </div>
        <div className={classNames(isBeside && 'col-start-1 row-start-1')}>
          {hang}
          {proposed !== null && (
            <MeasuredTable
              {...{ document, geometry, unit, selection, proposed }}
              drawn={prediction}
              measured={desk.prediction}
            />
          )}
        </div>
      </div>
    </section>
  );
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
