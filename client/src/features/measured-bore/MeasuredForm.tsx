import { useEffect, useRef } from 'react';
import type { MeasuredBore } from '#shared/measured-bore/read-measured-bore.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { classNames } from '../../ui/class-names.ts';
import { ColumnsForm } from './ColumnsForm.tsx';
import { FitWords } from './FitWords.tsx';
import { LimitsForm } from './LimitsForm.tsx';
import { counted } from './measured-words.ts';
import { PlaceForm } from './PlaceForm.tsx';
import { SourceForm } from './SourceForm.tsx';
import { TableForm } from './TableForm.tsx';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface MeasuredFormProps extends Pick<PanelProps, 'document' | 'unit'> {
  desk: MeasuredBoreDesk;
  isWide: boolean;
}

/** How the table is understood, by which limits it becomes stations, and what is in the way. */
export function MeasuredForm(props: MeasuredFormProps) {
  const { source, measured, isJustOpened } = props.desk;
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    // The button that opened the screen is gone with its header.
    if (isJustOpened) heading.current?.focus({ preventScroll: true });
  }, [isJustOpened]);
  const readings = measured?.status === 'read' ? counted(measured.readings.length, 'reading') : null;
  return (
    <>
      <h2 ref={heading} tabIndex={-1} className="text-section w-fit font-semibold">
        Measured bore{' '}
        <span className="text-data text-ink3 ml-1 font-normal">
          {[source.fileName, readings].filter((part) => part !== null).join(', ')}
        </span>
      </h2>
      {measured === null ? (
        <div className="mt-2">
          <SourceForm desk={props.desk} rows={9} />
        </div>
      ) : (
        <UnderstoodForm {...props} measured={measured} />
      )}
    </>
  );
}

interface UnderstoodFormProps extends MeasuredFormProps {
  measured: MeasuredBore;
}

function UnderstoodForm({ measured, ...props }: UnderstoodFormProps) {
  const { document, unit, desk, isWide } = props;
  const { fitted } = desk;
  const { table } = measured;
  return (
    <>
      <div className="@container mt-1">
        <ColumnsForm columns={measured.columns} onChange={desk.meanColumn} />
      </div>
      <div className={classNames(isWide && 'grid grid-cols-[0.9fr_1.1fr] gap-x-5')}>
        <div>
          {measured.status === 'read' && (
            <PlaceForm
              document={document}
              unit={unit}
              place={measured.place}
              isWide={isWide}
              onMean={desk.mean}
            />
          )}
        </div>
        {fitted !== null && (
          <div>
            <LimitsForm desk={desk} fitted={fitted} unit={unit} isWide={isWide} />
          </div>
        )}
      </div>
      <Refusals refusals={desk.refusals} />
      <Outcome {...props} measured={measured} />
      {typeof table?.doubt === 'string' && (
        <p className="bg-wait text-data text-ink mt-2 px-3 py-2">{table.doubt}</p>
      )}
      <TableForm desk={desk} table={table} />
    </>
  );
}

function Outcome({ document, unit, desk, measured }: UnderstoodFormProps) {
  const { fitted } = desk;
  if (measured.status !== 'read' || fitted === null || fitted.stations.length === 0) return null;
  const { readings, place } = measured;
  return <FitWords {...{ document, unit, desk, fitted, place }} readingCount={readings.length} />;
}

function Refusals({ refusals }: { refusals: readonly string[] }) {
  if (refusals.length === 0) return null;
  return (
    <div role="alert" className="border-stop bg-stop-soft text-data text-ink my-2 border-l-3 px-3 py-2">
      {refusals.map((refusal) => (
        <p key={refusal}>{refusal}</p>
      ))}
    </div>
  );
}
