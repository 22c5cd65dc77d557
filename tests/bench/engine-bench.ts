import { execFileSync } from 'node:child_process';
import { complex, cosh, divide, multiply, add, sinh, type Complex } from 'mathjs';
import { designSensitivities } from '#shared/analysis/design-sensitivities.ts';
import { coupledImpedance } from '#shared/acoustics/response/input-impedance.ts';
import { tuneColumn } from '#shared/acoustics/response/prepared-column.ts';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import { prepareDesign } from '#shared/analysis/prepare-design.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { whistleDocument } from '../support/whistle-document.ts';
import { figureOf, type Figure } from './figure.ts';

const CHART_RUNS = 300;
const HEAP_CHARTS = 2000;
const EVALUATIONS = 10_000;

/** Figures of the engine: chart warm and cold, derivatives, scaling, heap, and a plain computation to compare with. */
export async function measureEngine(): Promise<Record<string, unknown>> {
  const document = whistleDocument();
  const chart = timesOf(CHART_RUNS, () => void predictDesign(document));
  const warm = figureOf({ what: 'chart of a six-hole design, warm', unit: 'ms', budget: 1 }, chart);
  return {
    chart: warm,
    chartCold: coldChart(),
    sensitivities: sensitivities(document),
    scaling: scaling(),
    heapBytesPer10000Charts: heapGrowth(document),
    heapBytesPer10000Frequencies: heapOfEvaluations(document),
    plainComputation: await plainComputation(warm),
  };
}

function timesOf(runs: number, work: () => void): number[] {
  for (let i = 0; i < Math.ceil(runs / 2); i += 1) work();
  return Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  });
}

/** The first chart of a fresh process, modules loaded but nothing run before. */
function coldChart(): Figure {
  const script = new URL('engine-cold.ts', import.meta.url).pathname;
  const samples = Array.from({ length: 5 }, () =>
    Number(execFileSync(process.execPath, ['--import', 'tsx', script], { encoding: 'utf8' })),
  );
  return figureOf(
    { what: 'chart of a six-hole design, first in its process', unit: 'ms', budget: 10 },
    samples,
  );
}

function sensitivities(document: DesignDocument): Figure {
  const samples = timesOf(30, () => void designSensitivities(document));
  return figureOf(
    { what: 'cents per unit of every dimension of every note', unit: 'ms', budget: 3 },
    samples,
  );
}

const median = (samples: number[]) => samples.sort((a, b) => a - b)[samples.length >> 1] ?? NaN;

/** Milliseconds for growing numbers of holes, stations and fingerings. */
function scaling(): Record<string, Record<string, number>> {
  const series = (sizes: number[], document: (size: number) => DesignDocument) =>
    Object.fromEntries(
      sizes.map((size) => {
        const grown = document(size);
        return [size, Number(median(timesOf(20, () => void predictDesign(grown))).toPrecision(3))];
      }),
    );
  return {
    holes: series([3, 6, 12, 24], withHoles),
    stations: series([2, 50, 100, 200, 400], withStations),
    fingerings: series([9, 30, 60, 120], withFingerings),
  };
}

function withHoles(count: number): DesignDocument {
  const base = whistleDocument();
  const [pattern] = base.holes;
  if (pattern === undefined) throw new Error('The whistle has holes.');
  const holes = Array.from({ length: count }, (_, i) => ({
    ...pattern,
    id: `h${i + 1}`,
    diameterMm: 4,
    positionMm: 100 + (150 * i) / count,
  }));
  // From all covered to none: equal fingerings would be worked out but once.
  const covered = (i: number) =>
    holes.map(({ id }) => id).slice(0, Math.round(count * (1 - i / (base.fingerings.length - 1))));
  const fingerings = base.fingerings.map((fingering, i) => ({ ...fingering, covered: covered(i) }));
  return { ...base, holes, fingerings };
}

function withStations(count: number): DesignDocument {
  const base = whistleDocument();
  const [from, to] = [-4.4, 265];
  const stations = Array.from({ length: count }, (_, i) => ({
    positionMm: from + ((to - from) * i) / (count - 1),
    diameterMm: 12.7 + 0.1 * Math.sin(i),
  }));
  return { ...base, bore: { stations } };
}

/** Every way to cover six holes, then the same with one of the open ones half-covered: no two are equal. */
function withFingerings(count: number): DesignDocument {
  const base = whistleDocument();
  const [pattern] = base.fingerings;
  if (pattern === undefined) throw new Error('The whistle has fingerings.');
  const fingerings = Array.from({ length: count }, (_, i) => {
    const open = base.holes.filter((_hole, h) => ((i % 64) >> h) % 2 === 0).map(({ id }) => id);
    const covered = base.holes.map(({ id }) => id).filter((id) => !open.includes(id));
    const half =
      i < 64 ? [] : open.slice(0, 1).map((hole) => ({ hole, fraction: 0.5, from: 'side' as const }));
    return { ...pattern, id: `f${i}`, covered, half };
  });
  return { ...base, fingerings };
}

/** Bytes taken from the heap, none given back, while a column is set to ten thousand frequencies and solved at each. */
function heapOfEvaluations(document: DesignDocument): number | null {
  const { gc } = globalThis as { gc?: () => void };
  if (gc === undefined) return null;
  const { prepared, fingerings } = prepareDesign(document);
  const evaluate = () => {
    for (let i = 0; i < EVALUATIONS; i += 1) {
      tuneColumn(prepared, 200 + (i % 1000), true);
      for (const fingering of fingerings) coupledImpedance(prepared, fingering);
    }
  };
  evaluate();
  gc();
  const before = process.memoryUsage().heapUsed;
  evaluate();
  return process.memoryUsage().heapUsed - before;
}

/** Bytes of heap that stay after many charts, scaled to ten thousand. */
function heapGrowth(document: DesignDocument): number | null {
  const { gc } = globalThis as { gc?: () => void };
  if (gc === undefined) return null;
  gc();
  const before = process.memoryUsage().heapUsed;
  for (let i = 0; i < HEAP_CHARTS; i += 1) predictDesign(document);
  gc();
  return Math.round(((process.memoryUsage().heapUsed - before) * 10_000) / HEAP_CHARTS);
}

/**
 * Input impedance of the bare bore by a straightforward chain of mathjs complex numbers, as many frequencies as a chart takes
 * with samples every 10 Hz: the plain way to the same ladders, without tone holes.
 */
async function plainComputation(warm: Figure): Promise<{ milliseconds: number; ratio: number }> {
  const frequencies = Array.from({ length: 400 }, (_, i) => 10 + 10 * i);
  const samples = timesOf(3, () => {
    for (let fingering = 0; fingering < 9; fingering += 1) frequencies.forEach(plainImpedance);
  });
  const milliseconds = Number(median(samples).toPrecision(4));
  return Promise.resolve({ milliseconds, ratio: Number((milliseconds / warm.median).toPrecision(3)) });
}

function plainImpedance(frequency: number): Complex {
  const k = (2 * Math.PI * frequency) / 345;
  let load = complex(0.25 * (k * 6.35e-3) ** 2, 0.61 * k * 6.35e-3);
  for (let segment = 0; segment < 7; segment += 1) {
    const argument = complex(0.02 * k * 0.038, k * 0.038);
    const top = add(multiply(cosh(argument), load), sinh(argument));
    const bottom = add(multiply(sinh(argument), load), cosh(argument));
    load = divide(top, bottom) as Complex;
  }
  return load;
}
