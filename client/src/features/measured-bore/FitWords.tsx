import type { FittedBore, LoneReading } from '#shared/measured-bore/fit-stations.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { counted, gapWords, printLimit, printWidth, readingWords } from './measured-words.ts';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface FitWordsProps extends Pick<PanelProps, 'document' | 'unit'> {
  desk: Pick<MeasuredBoreDesk, 'source' | 'fit'>;
  fitted: FittedBore;
  readingCount: number;
}

/** What became of the readings, in sentences. */
export function FitWords({ document, unit, desk, fitted, readingCount }: FitWordsProps) {
  const { leftOut, restored, outside, stations } = fitted;
  const gaps = gapWords(fitted, unit);
  const setRestored = (keys: string[]) => desk.fit({ restored: keys });
  return (
    <div className="border-hair text-data text-ink2 border-t pt-2" role="status">
      <p>
        <b className="text-ink font-semibold">
          {counted(readingCount, 'reading')} {readingCount === 1 ? 'becomes' : 'become'}{' '}
          {counted(stations.length, 'station')}.
        </b>{' '}
        {leftOut.length > 0 && (
          <>
            {leftOut.length === 1 ? '1 is' : `${leftOut.length} are`} left out:{' '}
            {leftOut.length === 1 ? 'it stands' : 'they stand'} alone by more than{' '}
            {printWidth(fitted.limitMm, unit)}.{' '}
          </>
        )}
        No {leftOut.length > 0 ? 'other place' : 'place'} lies further than{' '}
        {printLimit(desk.source.fit.withinMm, unit)} from the line.
        {gaps !== null && ` ${gaps}`}
        {outside.length > 0 && ` ${outsideWords(outside.length)}`}
      </p>
      <LoneList
        {...{ document, unit }}
        readings={leftOut}
        verb="Use it"
        onPress={(key) => setRestored([...desk.source.fit.restored, key])}
      />
      <LoneList
        {...{ document, unit }}
        readings={restored}
        verb="Leave it out"
        onPress={(key) => setRestored(desk.source.fit.restored.filter((other) => other !== key))}
      />
    </div>
  );
}

function outsideWords(count: number): string {
  return count === 1
    ? '1 reading lies beyond the ends of the drawn bore, whose length stays as it is.'
    : `${count} readings lie beyond the ends of the drawn bore, whose length stays as it is.`;
}

interface LoneListProps extends Pick<PanelProps, 'document' | 'unit'> {
  readings: readonly LoneReading[];
  verb: string;
  onPress: (key: string) => void;
}

/** More than this many say that the limit is too small, not that the readings are bad. */
const SHOWN = 8;

function LoneList({ document, unit, readings, verb, onPress }: LoneListProps) {
  if (readings.length === 0) return null;
  return (
    <ul className="mt-1">
      {readings.slice(0, SHOWN).map((reading) => {
        const words = readingWords(document, reading, unit);
        const apart = `${printWidth(Math.abs(reading.aloneByMm), unit)} ${reading.aloneByMm > 0 ? 'wider' : 'narrower'} than its neighbours`;
        return (
          <li key={reading.key} className="flex flex-wrap items-center gap-x-2">
            <span>
              {words}, {apart}
            </span>
            <button
              type="button"
              aria-label={`${verb}: ${words}`}
              onClick={() => onPress(reading.key)}
              className="text-link min-h-6 font-semibold max-[1100px]:min-h-12 pointer-coarse:min-h-12"
            >
              {verb}
            </button>
          </li>
        );
      })}
      {readings.length > SHOWN && (
        <li>And {readings.length - SHOWN} more. A wider limit would leave out fewer.</li>
      )}
    </ul>
  );
}
