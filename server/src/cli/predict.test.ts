import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { problemSchema } from '#shared/contract/problem.ts';

const ROOT = fileURLToPath(new URL('../../../', import.meta.url));
const WHISTLE = 'seed-data/designs/high-whistle-d.json';

/** A child process on a busy machine, ms. */
const PATIENCE = 60_000;

const rungSchema = z.object({
  mode: z.int(),
  frequencyHz: z.number().positive(),
  centsFromMultiple: z.number(),
  strength: z.number().max(0),
  weak: z.boolean(),
});

const answerSchema = z.strictObject({
  engine: z.string().regex(/^borewright \d+\.\d+\.\d+$/),
  notices: z.array(z.object({ code: z.string(), message: z.string(), fingering: z.string().optional() })),
  fingerings: z.array(
    z.object({
      id: z.string(),
      note: z.string(),
      register: z.int(),
      frequencyHz: z.number().positive(),
      centsFromScale: z.number(),
      beatsHz: z.number(),
      ladder: z.array(rungSchema),
      impedance: z
        .array(z.strictObject({ frequencyHz: z.number(), re: z.number(), im: z.number() }))
        .optional(),
    }),
  ),
});

interface Run {
  stdout: string;
  stderr: string;
  exitCode: number | null;
}

/** The command in a process of its own, with nothing in its environment that could lead to a database. */
function runPredict(args: readonly string[], stdin = ''): Promise<Run> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/src/cli/predict.ts', ...args], {
      cwd: ROOT,
      env: { PATH: process.env.PATH },
    });
    let stdout = '';
    let stderr = '';
    child.stdout.setEncoding('utf8').on('data', (text: string) => (stdout += text));
    child.stderr.setEncoding('utf8').on('data', (text: string) => (stderr += text));
    child.on('error', reject);
    child.on('close', (exitCode) => {
      resolve({ stdout, stderr, exitCode });
    });
    child.stdin.end(stdin);
  });
}

async function predicted(args: readonly string[], stdin?: string): Promise<z.infer<typeof answerSchema>> {
  const { stdout, stderr, exitCode } = await runPredict(args, stdin);
  expect({ exitCode, stderr }).toEqual({ exitCode: 0, stderr: '' });
  return answerSchema.parse(JSON.parse(stdout));
}

/** A thin-walled lossless tube of 600 mm without holes, in air of 343 m/s. */
function tube(mouth: 'ideal-open' | 'ideal-closed', diameterMm: number, foot = 'open'): string {
  const stations = (width: number) => ({
    stations: [
      { positionMm: 0, diameterMm: width },
      { positionMm: 600, diameterMm: width },
    ],
  });
  return JSON.stringify({
    format: 'borewright-design/1',
    name: 'Tube',
    pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D' },
    air: {
      temperatureC: 20,
      relativeHumidity: 0.5,
      co2Fraction: 0,
      pressurePa: 101_325,
      losses: false,
      fixed: { speedOfSound: 343, density: 1.2 },
    },
    mouthEnd: { kind: mouth },
    bore: stations(diameterMm),
    outside: stations(diameterMm * 1.0001),
    foot: { kind: foot },
    holes: [],
    fingerings: [{ id: 'all', note: 'D4', register: 1, covered: [] }],
  });
}

describe.concurrent('predict command', () => {
  it(
    'prints one JSON object with every fingering of a design file, and needs no database',
    { timeout: PATIENCE },
    async () => {
      const { fingerings } = await predicted([WHISTLE]);
      const { fingerings: asked } = z
        .object({ fingerings: z.array(z.object({ id: z.string(), note: z.string(), register: z.int() })) })
        .parse(JSON.parse(readFileSync(`${ROOT}${WHISTLE}`, 'utf8')));
      expect(fingerings.map(({ id, note, register }) => ({ id, note, register }))).toEqual(asked);
      for (const { ladder } of fingerings) {
        expect(ladder.length).toBeLessThanOrEqual(6);
        expect(ladder.map(({ mode }) => mode)).toEqual(ladder.map((_, i) => i + 1));
        expect(Math.max(...ladder.map(({ strength }) => strength))).toBe(0);
        expect(ladder[0]?.centsFromMultiple).toBe(0);
      }
      expect(fingerings[0]?.ladder).toHaveLength(6);
    },
  );

  it('measures cents and beats from the equal-tempered scale', { timeout: PATIENCE }, async () => {
    const { fingerings } = await predicted([WHISTLE, '--modes', '24']);
    const d5 = fingerings[0];
    // Five semitones above A4 = 440 Hz in equal temperament: the definition.
    const target = 440 * 2 ** (5 / 12);
    expect(d5?.note).toBe('D5');
    expect(d5?.centsFromScale).toBeCloseTo(1200 * Math.log2((d5?.frequencyHz ?? NaN) / target), 6);
    expect(Math.abs(d5?.beatsHz ?? NaN)).toBeCloseTo(Math.abs((d5?.frequencyHz ?? NaN) - target), 6);
    // High rungs leak out at the foot and at open holes, and say so.
    const weak = fingerings.flatMap(({ ladder }) => ladder.filter((rung) => rung.weak));
    expect(weak.length).toBeGreaterThan(0);
    expect(d5?.ladder.slice(0, 2).map((rung) => rung.weak)).toEqual([false, false]);
  });

  it(
    'gives as many modes as asked for of a document from standard input',
    { timeout: PATIENCE },
    async () => {
      const [three, most] = await Promise.all([
        predicted(['-', '--modes', '3'], tube('ideal-open', 15)),
        predicted(['--modes=24', '-'], tube('ideal-open', 1, 'stopped')),
      ]);
      expect(three.fingerings.map(({ ladder }) => ladder.length)).toEqual([3]);
      const ladder = most.fingerings[0]?.ladder ?? [];
      expect(ladder).toHaveLength(24);
      // Open–stopped without losses: odd multiples of c/4L, any textbook of acoustics.
      ladder.forEach(({ frequencyHz, mode }) => {
        expect(frequencyHz).toBeCloseTo(((2 * mode - 1) * 343) / (4 * 0.6), 4);
      });
    },
  );

  it('says where a ladder has fewer modes than were asked for', { timeout: PATIENCE }, async () => {
    const { notices, fingerings } = await predicted([WHISTLE, '--modes', '24']);
    const ended = notices.filter(({ code }) => code === 'ladder-ends').map(({ fingering }) => fingering);
    const short = fingerings.filter(({ ladder }) => ladder.length < 24).map(({ id }) => id);
    expect(short.length).toBeGreaterThan(0);
    expect(ended).toEqual(short);
  });

  it('adds the input impedance in units of the characteristic impedance', { timeout: PATIENCE }, async () => {
    const { fingerings } = await predicted(['-', '--impedance', '100,1000,100'], tube('ideal-open', 15));
    const points = fingerings[0]?.impedance ?? [];
    expect(points.map(({ frequencyHz }) => frequencyHz)).toEqual([
      100, 200, 300, 400, 500, 600, 700, 800, 900, 1000,
    ]);
    for (const { frequencyHz, re, im } of points.filter(({ frequencyHz: f }) => f % 300 === 200)) {
      // j·tan(k(L + δ)) of a lossless tube, any textbook of acoustics; δ = 0.6133 radii at a thin-walled end,
      // H. Levine and J. Schwinger, Phys. Rev. 73 (1948) 383.
      const wavenumber = (2 * Math.PI * frequencyHz) / 343;
      const expected = Math.tan(wavenumber * (0.6 + 0.6133 * 7.5e-3));
      // A hundredth of a radius in δ moves the tangent by k·δ′·(1 + tan²).
      const slack = wavenumber * 0.01 * 7.5e-3 * (1 + expected * expected);
      expect(Math.abs(im - expected)).toBeLessThan(slack);
      // Only the radiation at the foot, (ka)²/4 seen through the tube, takes power.
      const radiation = ((wavenumber * 7.5e-3) ** 2 / 4) * (1 + expected * expected);
      expect(re / radiation).toBeGreaterThan(0.9);
      expect(re / radiation).toBeLessThan(1.1);
    }
  });
});

const whistle = JSON.parse(readFileSync(`${ROOT}${WHISTLE}`, 'utf8')) as Record<string, unknown>;
const twoFaults = JSON.stringify({ ...whistle, name: '', foot: { kind: 'ajar' }, frobnicate: 1 });

const REFUSALS = [
  { what: 'an unknown flag', args: ['--frobnicate', WHISTLE], path: 'arguments' },
  { what: 'no modes', args: [WHISTLE, '--modes', '0'], path: '--modes' },
  { what: 'more modes than a ladder has', args: [WHISTLE, '--modes', '25'], path: '--modes' },
  { what: 'modes that are no number', args: [WHISTLE, '--modes', 'x'], path: '--modes' },
  { what: 'two frequencies for three', args: [WHISTLE, '--impedance', '100,1000'], path: '--impedance' },
  { what: 'more points than it draws', args: [WHISTLE, '--impedance', '1,9e9,1'], path: '--impedance' },
  { what: 'a file that is not there', args: ['no-such-design.json'], path: 'file' },
  { what: 'broken JSON', args: ['-'], stdin: '{"format":', path: 'file' },
];

function problemIn({ stdout, stderr, exitCode }: Run): z.infer<typeof problemSchema> {
  expect({ exitCode, stdout }).toEqual({ exitCode: 2, stdout: '' });
  const problem = problemSchema.parse(JSON.parse(stderr));
  expect(problem.type).not.toBe('');
  expect(problem.title).not.toBe('');
  expect(problem.detail).not.toBe('');
  return problem;
}

describe.concurrent('predict command refuses', () => {
  it.each(REFUSALS)('$what', { timeout: PATIENCE }, async ({ args, stdin, path }) => {
    const problem = problemIn(await runPredict(args, stdin));
    expect(problem.status).toBe(400);
    expect(problem.errors?.map((error) => error.path)).toEqual([path]);
  });

  it.each([
    ['no-such-design.json', 'no-such-design.json is not there. Check the name of the design document.'],
    ['seed-data', 'seed-data is a folder. Give the design document in it.'],
  ])('%s in one plain sentence', { timeout: PATIENCE }, async (file, sentence) => {
    expect(problemIn(await runPredict([file])).detail).toBe(sentence);
  });

  it('a document with faults, each under its own field', { timeout: PATIENCE }, async () => {
    const problem = problemIn(await runPredict(['-'], twoFaults));
    expect(problem.status).toBe(422);
    const paths = problem.errors?.map((error) => error.path) ?? [];
    expect(paths).toEqual(expect.arrayContaining(['name', 'foot.kind']));
    expect(JSON.stringify(problem.errors)).toContain('frobnicate');
  });
});
