import { readFileSync, readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import { readDocument } from '#shared/document/read-document.ts';
import { centsBetween } from '#shared/music/cents.ts';

interface Extremum {
  index: number;
  f_hz: number;
  absZ: number;
}

type Expected = Record<'min' | 'max', Record<string, Extremum[]>>;

const folder = new URL('fem/', import.meta.url);
const read = (name: string): unknown => JSON.parse(readFileSync(new URL(name, folder), 'utf8'));
const bodies = readdirSync(folder)
  .filter((name) => name.endsWith('.expected.json'))
  .map((name) => name.replace('.expected.json', ''));

/** Cents of every clear resonance from the finite elements', by register. */
function deviations(body: string, mouth: 'ideal-open' | 'ideal-closed'): number[][] {
  const reading = readDocument(read(`${body}.${mouth}.json`));
  if (reading.status === 'refused') throw new Error(JSON.stringify(reading.faults));
  const { expected } = read(`${body}.expected.json`) as { expected: Expected };
  const byRegister: number[][] = [];
  for (const { id, ladder } of predictDesign(reading.document).fingerings) {
    for (const { index, f_hz, absZ } of expected[mouth === 'ideal-open' ? 'min' : 'max'][id] ?? []) {
      if (absZ > 1 / 3 && absZ < 3) continue;
      const rung = ladder.find(({ mode }) => mode === index);
      if (rung === undefined) throw new Error(`${id} lacks mode ${index}`);
      (byRegister[index] ??= []).push(centsBetween(rung.frequencyHz, f_hz));
    }
  }
  return byRegister;
}

const largest = (cents: readonly number[]) => Math.max(0, ...cents.map(Math.abs));
const rms = (cents: readonly number[]) =>
  Math.sqrt(cents.reduce((sum, value) => sum + value * value, 0) / Math.max(cents.length, 1));

describe('ladders of whole bodies against three-dimensional finite elements, without losses', () => {
  const cases = bodies.flatMap((body) => [[body, 'ideal-open'] as const, [body, 'ideal-closed'] as const]);

  it('has bodies to hold against', () => expect(bodies.length).toBeGreaterThanOrEqual(11));

  it.each(cases)('%s, %s', (body, mouth) => {
    const [, first = [], second = [], ...higher] = deviations(body, mouth);
    expect(first.length).toBeGreaterThan(0);
    if (body.startsWith('0')) {
      // A bore without holes.
      expect(largest([...first, ...second, ...higher.flat()])).toBeLessThan(0.35);
      return;
    }
    expect(largest(first)).toBeLessThan(0.6);
    expect(largest(second)).toBeLessThan(1.3);
    expect(rms(higher.flat())).toBeLessThan(2);
  });
});
