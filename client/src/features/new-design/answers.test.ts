import { describe, expect, it } from 'vitest';
import { STARTER_KINDS } from '#shared/document/starter-documents.ts';
import {
  adviseBore,
  boreOf,
  chooseKind,
  chooseLowestNote,
  drawAnswers,
  firstAnswers,
  lowestNotesOf,
  nameOf,
  tonicOf,
} from './answers.ts';

const start = firstAnswers({ a4Hz: 442, temperatureC: 21 });

describe('the answers to a new design', () => {
  it("begin with the workshop's pitch and air", () => {
    expect(start).toMatchObject({ a4Hz: 442, temperatureC: 21 });
  });

  it('name the design after its kind and key until a name is typed', () => {
    expect(nameOf(start)).toBe('Fipple whistle in D');
    expect(nameOf(chooseLowestNote(start, 'Bb4'))).toBe('Fipple whistle in Bb');
    expect(nameOf({ ...chooseLowestNote(start, 'Bb4'), name: 'Tern' })).toBe('Tern');
  });

  it('take the key from the lowest note until another is chosen', () => {
    expect(tonicOf(chooseLowestNote(start, 'F#4'))).toBe('F#');
    expect(tonicOf({ ...start, tonic: 'G' })).toBe('G');
  });

  it('keep the lowest note with another kind where it can be made, and give up a bore of the last kind', () => {
    expect(chooseKind({ ...start, boreMm: 12.7 }, 'recorder')).toMatchObject({
      lowestNote: 'D5',
      boreMm: null,
    });
    expect(chooseKind(chooseLowestNote(start, 'C6'), 'reed-pipe').lowestNote).toBe('G3');
  });

  it.each(STARTER_KINDS)('offer lowest notes of a %s from low to high, the usual spelling each', (kind) => {
    const notes = lowestNotesOf(kind);
    expect(notes).toContain('Bb3');
    expect(notes).toContain('F#3');
    expect(new Set(notes).size).toBe(notes.length);
  });
});

describe('adviseBore', () => {
  it('says nothing about the usual bore', () => {
    expect(adviseBore(start, 'mm')).toEqual({ status: 'fine' });
    expect(adviseBore({ ...start, boreMm: boreOf(start) }, 'mm')).toEqual({ status: 'fine' });
  });

  it('asks for a wider one where the note would not speak, with the figure that would do', () => {
    const narrow = { ...chooseLowestNote(start, 'D4'), boreMm: 9 };
    const advice = adviseBore(narrow, 'mm');
    if (advice.status === 'fine') throw new Error('A low whistle of 9 mm bore got no word.');
    expect(advice.message).toMatch(
      /^A fipple whistle down to D4 needs a bore of at least [\d.]+ mm to speak\. Make it /,
    );
    const enough = Number(/Make it ([\d.]+)/.exec(advice.message)?.[1]);
    expect(adviseBore({ ...narrow, boreMm: enough }, 'mm')).toEqual({ status: 'fine' });
  });

  it('asks for a narrower one where it would overblow, in the unit of the person', () => {
    const advice = adviseBore({ ...start, boreMm: 40 }, 'inch');
    expect(advice).toMatchObject({ status: 'wrong' });
    expect(JSON.stringify(advice)).toContain(' in.');
  });
});

describe('drawAnswers', () => {
  it.each(STARTER_KINDS)('draws a %s whose plain notes meet the scale', (kind) => {
    const drawing = drawAnswers(chooseKind(start, kind));
    if (drawing.status !== 'drawn') throw new Error(drawing.messages.join(' '));
    expect(drawing.document.name).toBe(nameOf(chooseKind(start, kind)));
    expect(drawing.document.pitch).toMatchObject({ a4Hz: 442, temperament: 'equal' });
    expect(drawing.document.holes.length).toBeGreaterThanOrEqual(6);
    // Half a cent is what the placing is asked for; a tenth of a millimetre's rounding comes on top.
    expect(Math.abs(drawing.furthestCents ?? Infinity)).toBeLessThan(1);
  });

  it('says what is wrong instead of drawing what cannot be', () => {
    const drawing = drawAnswers({ ...start, boreMm: 0.01, name: '' });
    expect(drawing.status).toBe('refused');
  });
});
