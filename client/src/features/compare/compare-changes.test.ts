import { describe, expect, it } from 'vitest';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { takeDifference } from '#shared/document/document-difference.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { compareChanges, sameWords } from './compare-changes.ts';
import { compare, turned, usuallyLaidAt, type ComparedSide } from './comparison.ts';

const whistle = whistleDocument();

const changed = (change: (document: DesignDocument) => void): DesignDocument => {
  const document = structuredClone(whistle);
  change(document);
  return document;
};

const side = (label: string, document: DesignDocument): ComparedSide => ({
  label,
  document,
  prediction: predictDesign(document, { modes: 1 }),
  hasFailed: false,
});

const compared = (a: DesignDocument, b: DesignDocument) =>
  compare(side('A', a), side('B', b), usuallyLaidAt(a, b));

const sentences = (a: DesignDocument, b: DesignDocument, unit: 'mm' | 'inch' = 'mm') =>
  compareChanges(compared(a, b), unit).map(({ title, words }) => `${title} ${words}`);

const wider = changed((document) => {
  document.holes[3] = { ...document.holes[3]!, positionMm: 188, diameterMm: 7 };
});

describe('what differs between two instruments', () => {
  it('is nothing between an instrument and itself, whatever it is called', () => {
    expect(
      sentences(
        whistle,
        changed((document) => (document.name = 'Another name')),
      ),
    ).toEqual([]);
  });

  it('says where a hole went, how wide it became, and what the note did', () => {
    const [change, ...others] = compareChanges(compared(whistle, wider), 'mm');
    expect(others).toEqual([]);
    expect(change).toMatchObject({
      title: 'Hole 4',
      words: 'moved 1.2 mm footward, 6.5 to 7.0 mm',
      hole: 'h4',
    });
    expect(change?.pitch).toMatch(/^G5 [+−]?\d+\.\d to [+−]?\d+\.\d$/);
  });

  it('says it the other way round when they are turned', () => {
    expect(compareChanges(turned(compared(whistle, wider)), 'mm')[0]?.words).toBe(
      'moved 1.2 mm toward the window, 7.0 to 6.5 mm',
    );
  });

  it('speaks inches to those who do', () => {
    expect(sentences(whistle, wider, 'inch')).toEqual(['Hole 4 moved 0.047 in footward, 0.256 to 0.276 in']);
  });

  it('tells new and gone holes, bore, mouth end, pitch and chart', () => {
    const other = changed((document) => {
      document.holes.push({ ...document.holes[5]!, id: 'h7', name: '7', positionMm: 240, diameterMm: 4 });
      document.bore.stations[1]!.diameterMm = 12.5;
      document.pitch.a4Hz = 415;
      document.fingerings[0]!.covered.push('h7');
      if (document.mouthEnd.kind === 'window') document.mouthEnd.widthMm = 8.4;
    });
    expect(sentences(whistle, other)).toEqual([
      'Hole 7 new: 4.0 mm, 25.0 from foot',
      'Bore 0.20 mm narrower at most, 0.0 from foot',
      'Mouth end width 9.0 mm to 8.4 mm',
      'A4 440 Hz to 415 Hz',
      'Chart 1 fingering differs',
    ]);
    expect(sentences(other, whistle)[0]).toBe('Hole 7 gone; was 4.0 mm, 25.0 from foot');
  });

  it('counts holes from where the two are laid together', () => {
    const trimmed = changed((document) => {
      document.bore.stations[1]!.positionMm = 262;
      document.outside.stations[1]!.positionMm = 262;
    });
    expect(sentences(whistle, trimmed)).toEqual(['Bore 3.0 mm shorter', 'Outside of another shape']);
    const atFoot = compare(side('A', whistle), side('B', trimmed), 'foot');
    expect(compareChanges(atFoot, 'mm')[0]?.words).toBe('moved 3.0 mm footward');
  });

  it('carries what has to be taken over to make the first like the second', () => {
    const other = changed((document) => {
      document.holes[0]!.diameterMm = 6;
      document.holes[4]!.undercut = { innerDiameterMm: 9.5, depthMm: 2 };
      document.bore.stations[1]!.diameterMm = 12.6;
    });
    const changes = compareChanges(compared(whistle, other), 'mm');
    expect(changes.flatMap(({ differences }) => differences).reduce(takeDifference, whistle)).toEqual(other);
    const holes = changes.filter(({ part }) => part === 'hole').flatMap(({ differences }) => differences);
    expect(holes.reduce(takeDifference, whistle).bore).toEqual(whistle.bore);
  });

  it('names the parts that are the same', () => {
    expect(sameWords(compareChanges(compared(whistle, wider), 'mm'))).toBe(
      'bore, mouth end and chart the same',
    );
  });
});

describe('laying two together', () => {
  it.each([
    [265, 'mouth'],
    [262, 'mouth'],
    [230, 'foot'],
    [530, 'foot'],
  ] as const)('an instrument of 265 mm and one of %s mm at the %s', (footMm, laidAt) => {
    const other = changed((document) => {
      document.bore.stations[1]!.positionMm = footMm;
    });
    expect(usuallyLaidAt(whistle, other)).toBe(laidAt);
  });
});
