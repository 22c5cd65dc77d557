import { describe, expect, it } from 'vitest';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { atTemperature } from '#shared/transform/other-temperature.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { compare, type ComparedSide } from './comparison.ts';
import { ghostCents, noteRows } from './note-rows.ts';
import { summaryRows } from './summary-rows.ts';
import { comparedRows } from './table-cells.ts';

const whistle = whistleDocument();

const side = (label: string, document: DesignDocument): ComparedSide => ({
  label,
  document,
  prediction: predictDesign(document, { modes: 1 }),
  hasFailed: false,
});

const warmed = compare(side('22 °C', whistle), side('32 °C', atTemperature(whistle, 32)), 'mouth');

describe('the notes of two', () => {
  it('all rise with the temperature of the air by what the speed of sound does', () => {
    const rows = noteRows(warmed);
    expect(rows.map(({ a }) => a?.note)).toEqual(whistle.fingerings.map(({ note }) => note));
    // Speed of sound goes with the square root of the absolute temperature: 600 log2(305.15/295.15) = 28.8 cents, and
    // moist air rises a little more (common practice: about 3 cents a degree).
    for (const { movedCents } of rows) {
      expect(movedCents).toBeGreaterThan(27.5);
      expect(movedCents).toBeLessThan(33);
    }
  });

  it('stand alone where the other has none', () => {
    const fewer = { ...whistle, fingerings: whistle.fingerings.slice(1) };
    const rows = noteRows(compare(side('A', whistle), side('B', fewer), 'mouth'));
    expect(rows).toHaveLength(whistle.fingerings.length);
    expect(rows.at(-1)).toMatchObject({ a: { note: 'D5' }, b: null, movedCents: null });
  });

  it('hang as ghosts by the names of the second', () => {
    const ghosts = ghostCents(warmed);
    expect([...ghosts.keys()]).toEqual(whistle.fingerings.map(({ id }) => id));
    expect(ghosts.get('f-d5')).toBe(warmed.a.prediction?.fingerings[0]?.centsFromScale);
  });
});

describe('the figures of two', () => {
  const other = structuredClone(whistle);
  other.holes[3] = { ...other.holes[3]!, positionMm: 188, diameterMm: 7 };
  const compared = compare(side('A', whistle), side('B', other), 'mouth');
  const figure = (row: string, column: string) =>
    comparedRows(compared, 'mm')
      .find(({ key }) => key === row)
      ?.figures.get(column);

  it('stand struck beside the new where they changed, and alone where they did not', () => {
    expect(figure('position', 'h4')).toEqual({ was: '78.2', now: '77.0' });
    expect(figure('diameter', 'h4')).toEqual({ was: '6.5', now: '7.0' });
    expect(figure('diameter', 'h1')).toEqual({ was: null, now: '7.0' });
    expect(figure('reach', 'h4')).toEqual({ was: '14.0', now: '12.8' });
    expect(figure('diameter', 'foot')).toEqual({ was: null, now: '12.7' });
  });

  it('come to hands, walls and drills', () => {
    const rows = new Map(summaryRows(compared, 'mm').map(({ label, a, b }) => [label, [a, b]]));
    expect(rows.get('Spread of the right hand, mm')).toEqual(['32.8', '31.6']);
    // 200.8 − 186.8 − (6.5 + 9) / 2, and 200.8 − 188 − (7 + 9) / 2.
    expect(rows.get('Least wall between holes, mm')).toEqual(['6.3', '4.8']);
    expect(rows.get('Final drills')).toEqual(['6', '5']);
    expect(rows.get('Mouth end to foot, mm')).toEqual(['265.0', '265.0']);
  });
});
