import { describe, expect, it } from 'vitest';
import { documentFaults } from '#shared/document/document-faults.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { lowestChartedNote, usualChart } from './usual-chart.ts';

const whistle = whistleDocument();
const thumb = { ...whistle.holes[0]!, id: 'th', positionMm: 100, cover: 'thumb' as const };
const seventh = { ...whistle.holes[5]!, id: 'h7', positionMm: 235 };
const recorder = { ...whistle, holes: [thumb, ...whistle.holes, seventh] };

describe('the usual chart', () => {
  it('of six holes opens them from the foot, in both registers', () => {
    const chart = usualChart(whistle, 'D5')!;
    expect(chart.map(({ note, register }) => `${note} ${register}`).slice(0, 7)).toEqual([
      ...['D5 1', 'E5 1', 'F#5 1', 'G5 1', 'A5 1', 'B5 1', 'C#6 1'],
    ]);
    expect(documentFaults({ ...whistle, fingerings: chart })).toEqual([]);
  });

  it('of seven holes and a thumb hole uses the thumb', () => {
    const chart = usualChart(recorder, 'F4')!;
    expect(chart[0]!.covered).toContain('th');
    expect(documentFaults({ ...recorder, fingerings: chart })).toEqual([]);
  });

  it.each([
    ['five holes', { ...whistle, holes: whistle.holes.slice(1) }],
    [
      'six holes closed at the mouth end',
      { ...whistle, mouthEnd: { kind: 'reed' as const, equivalentVolumeMm3: 500, correctionScale: 1 } },
    ],
  ])('does not exist for %s', (_what, document) => {
    expect(usualChart(document, 'D5')).toBeNull();
  });
});

describe('the lowest note', () => {
  it('is that of the fullest fingering, or the tonic', () => {
    expect(lowestChartedNote(whistle)).toBe('D5');
    expect(lowestChartedNote({ ...whistle, fingerings: [] })).toBe('D4');
  });
});
