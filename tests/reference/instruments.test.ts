import { describe, expect, it } from 'vitest';
import { chainImpedance } from '#shared/acoustics/response/chain.ts';
import { boreRadiusAt, type Column, type HoleState } from '#shared/acoustics/response/column.ts';
import { prepareColumn, tuneColumn } from '#shared/acoustics/response/prepared-column.ts';
import { findResonances } from '#shared/acoustics/response/resonances.ts';
import table from './tables/instruments.json' with { type: 'json' };

type Bodies = Record<string, { bore: number[][]; Rout: number; holes_mm: number[][] }>;
type Media = Record<
  string,
  { c: number; rho: number; eta: number; gamma: number; Pr: number; lossless: boolean }
>;

/** Only those without coupling: the independent computation leaves the field inside the bore out. */
const cases = Object.entries(
  table.results as unknown as Record<string, { Z: number[][]; min: number[]; max: number[] }>,
).filter(([name]) => name.includes('|REF_none|'));

function columnOf(bodyName: string, mediumName: string): Column {
  const body = (table.instruments as unknown as Bodies)[bodyName]!;
  const medium = (table.media as Media)[mediumName]!;
  const bore = body.bore.map(([position, radius]) => ({ position: position!, radius: radius! }));
  return {
    bore,
    input: 0,
    mouth: { kind: 'ideal-open' },
    foot: { kind: 'open', outerRadius: body.Rout },
    holes: body.holes_mm.map(([positionMm, diameterMm]) => {
      const boreRadius = boreRadiusAt(bore, positionMm! / 1000);
      return {
        position: positionMm! / 1000,
        radius: diameterMm! / 2000,
        boreRadius,
        outerRadius: body.Rout,
        chimney: body.Rout - boreRadius,
        angle: 0,
        flare: null,
        lid: 'curved',
        pad: null,
      };
    }),
    outside: {
      speedOfSound: medium.c,
      density: medium.rho,
      viscosity: medium.eta,
      heatCapacityRatio: medium.gamma,
      prandtl: medium.Pr,
      lossless: medium.lossless,
    },
    warmth: null,
  };
}

describe('whole instruments against an independent computation from the same rules', () => {
  it.each(cases)('gives impedance and resonances of %s', (name, expected) => {
    const [body, medium, , fingering] = name.split('|') as [string, string, string, string];
    const states = Array.from(fingering, (mark): HoleState => ({ kind: mark === 'X' ? 'closed' : 'open' }));
    const { prepared, fingerings } = prepareColumn(columnOf(body, medium), [states]);
    for (const [frequency, re, im] of expected.Z) {
      tuneColumn(prepared, frequency!, false);
      const at = chainImpedance(prepared, fingerings[0]!);
      const error = Math.hypot(
        prepared.cells[at]! / prepared.inputImpedance - re!,
        prepared.cells[at + 1]! / prepared.inputImpedance - im!,
      );
      expect(error / Math.hypot(re!, im!)).toBeLessThan(1e-6);
    }
    for (const maxima of [false, true]) {
      const found = findResonances(prepared, fingerings, { count: 9, coupling: false, maxima })[0]!;
      const listed = maxima ? expected.max : expected.min;
      // The list also holds crossings where the phase rises, which are no resonances: ours must all be in it.
      const highest = listed.at(-1)! * 1.0001;
      const below = found.filter(({ frequency }) => frequency <= highest);
      expect(below.length).toBeGreaterThanOrEqual(listed.length - 1);
      for (const { frequency } of below) {
        const nearest = Math.min(...listed.map((other) => Math.abs(frequency / other - 1)));
        expect(nearest).toBeLessThan(1e-7);
      }
    }
  });
});
