import type { FittedBore, LoneReading } from '#shared/measured-bore/fit-stations.ts';
import type { MeasuredPlace } from '#shared/measured-bore/read-measured-bore.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { counted, EDGE_WORDS, gapWords, printLimit, printWidth, readingWords } from './measured-words.ts';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface FitWordsProps extends Pick<PanelProps, 'document' | 'unit'> {
  desk: Pick<MeasuredBoreDesk, 'source' | 'fit'>;
  fitted: FittedBore;
  readingCount: number;
  place: MeasuredPlace;
}

/** What became of the readings, in sentences. */
export function FitWords({ document, unit, desk, fitted, readingCount, place }: FitWordsProps) {
  const { leftOut, restored, outside, stations } = fitted;
  const aligned = alignedWords(document, place, unit);
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
        {aligned !== null && ` ${aligned}`}
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

/** A place that was guessed has to be seen: a bore laid askew is a wrong bore. */
function alignedWords(
  { mouthEnd }: FitWordsProps['document'],
  { from, zeroMm, isGuess }: MeasuredPlace,
  unit: FitWordsProps['unit'],
): string | null {
  if (!isGuess || from === 'foot' || zeroMm === 0) return null;
  const edge = EDGE_WORDS[mouthEnd.kind].toLowerCase();
  return `The ${edge} was taken to lie at ${printLength(zeroMm, unit)} in the table, so that the last reading is at the foot.`;
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
          <li key={reading.key} className="flex items-center gap-x-3">
            <span>
              {words}, {apart}
            </span>
            <button
              type="button"
              aria-label={`${verb}: ${words}`}
              onClick={() => onPress(reading.key)}
              className="text-link min-h-6 shrink-0 font-semibold max-[1100px]:min-h-12 pointer-coarse:min-h-12"
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
