import { readFileSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { EngineInputError } from '#shared/acoustics/engine-input-error.ts';
import { impedanceCurves, type FrequencyRange } from '#shared/analysis/impedance-curve.ts';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignPrediction, Notice } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { readDocument } from '#shared/document/read-document.ts';
import { CommandFault } from './command-fault.ts';

const USAGE = 'predict FILE.json|- [--modes N] [--impedance FROM,TO,STEP]';

/** Most rungs of a ladder that may be asked for. */
const MOST_MODES = 24;

interface Command {
  file: string;
  modes: number | undefined;
  impedance: FrequencyRange | undefined;
}

function readCommand(args: string[]): Command {
  let parsed;
  try {
    parsed = parseArgs({
      args,
      allowPositionals: true,
      options: { modes: { type: 'string' }, impedance: { type: 'string' } },
    });
  } catch (error) {
    throw new CommandFault('arguments', error instanceof Error ? error.message : USAGE);
  }
  const [file, ...rest] = parsed.positionals;
  if (file === undefined || rest.length > 0) {
    throw new CommandFault('arguments', `Give one design document. Usage: ${USAGE}`);
  }
  const { modes, impedance } = parsed.values;
  return {
    file,
    modes: modes === undefined ? undefined : readModes(modes),
    impedance: impedance === undefined ? undefined : readRange(impedance),
  };
}

function readModes(text: string): number {
  const modes = Number(text);
  if (text.trim() !== '' && Number.isInteger(modes) && modes >= 1 && modes <= MOST_MODES) return modes;
  throw new CommandFault('--modes', `Give a whole number of modes from 1 to ${MOST_MODES}, not "${text}".`);
}

function readRange(text: string): FrequencyRange {
  const parts = text.split(',').map((part) => (part.trim() === '' ? NaN : Number(part)));
  const [fromHz = NaN, toHz = NaN, stepHz = NaN] = parts;
  if (parts.length === 3 && fromHz > 0 && toHz >= fromHz && stepHz > 0 && Number.isFinite(toHz)) {
    return { fromHz, toHz, stepHz };
  }
  throw new CommandFault(
    '--impedance',
    `Give three frequencies in Hz, FROM,TO,STEP with FROM above 0, TO not below it and STEP above 0, not "${text}".`,
  );
}

function readText(file: string): string {
  try {
    return readFileSync(file === '-' ? 0 : file, 'utf8');
  } catch (error) {
    throw new CommandFault('file', `${file === '-' ? 'Standard input' : file} ${unreadable(error)}`);
  }
}

/** Why a file cannot be read, in words for who typed its name. */
function unreadable(error: unknown): string {
  switch (error instanceof Error && 'code' in error ? error.code : undefined) {
    case 'ENOENT':
    case 'ENOTDIR':
      return 'is not there. Check the name of the design document.';
    case 'EISDIR':
      return 'is a folder. Give the design document in it.';
    case 'EACCES':
    case 'EPERM':
      return 'may not be read by you. Check its permissions.';
    default:
      return `cannot be read: ${error instanceof Error ? error.message : String(error)}.`;
  }
}

function readDesign(file: string): DesignDocument {
  let json: unknown;
  try {
    // Some editors begin a file with a byte order mark, which JSON does not allow.
    json = JSON.parse(readText(file).replace(/^\uFEFF/, ''));
  } catch (error) {
    if (error instanceof CommandFault) throw error;
    const reason = error instanceof Error ? error.message : String(error);
    throw new CommandFault('file', `This is not JSON: ${reason}.`);
  }
  const reading = readDocument(json);
  if (reading.status === 'read') return reading.document;
  throw new CommandFault(
    'document',
    'The design document cannot be predicted as it stands.',
    reading.faults.map(({ path, message }) => ({ path: path.join('.'), message })),
  );
}

function predict({ file, modes, impedance }: Command): unknown {
  const document = readDesign(file);
  const prediction = predictDesign(document, modes === undefined ? {} : { modes });
  const curves = impedance === undefined ? [] : impedanceCurves(document, impedance);
  return {
    engine: prediction.engine,
    notices: [
      ...prediction.notices,
      ...prediction.fingerings.flatMap(({ id, notices }) =>
        notices.map((notice) => ({ ...notice, fingering: id })),
      ),
      ...endedLadders(prediction, modes ?? 0),
    ],
    fingerings: prediction.fingerings.map((fingering) => {
      const curve = curves.find(({ fingering: id }) => id === fingering.id);
      return curve === undefined ? fingering : { ...fingering, impedance: curve.points };
    }),
  };
}

/** Fewer resonances than were asked for are no oversight: above the last one none is left that would be one. */
function endedLadders({ fingerings }: DesignPrediction, modes: number): (Notice & { fingering: string })[] {
  return fingerings
    .filter(({ ladder }) => ladder.length < modes)
    .map(({ id, ladder }) => ({
      code: 'ladder-ends',
      message: `${ladder.length} of ${modes} resonances are there. Above the last one the openings let the sound out before it can come back.`,
      fingering: id,
    }));
}

function problemOf(error: unknown): unknown {
  if (error instanceof CommandFault) return error.problem();
  if (error instanceof EngineInputError) {
    if (error.field === 'range') return new CommandFault('--impedance', error.message).problem();
    return new CommandFault('document', error.message, [
      { path: error.field, message: error.message },
    ]).problem();
  }
  throw error;
}

try {
  process.stdout.write(`${JSON.stringify(predict(readCommand(process.argv.slice(2))))}\n`);
} catch (error) {
  process.stderr.write(`${JSON.stringify(problemOf(error))}\n`);
  process.exitCode = 2;
}
