import { parse, type MathNode } from 'mathjs/number';
import { drillByName, MM_PER_INCH } from './drills.ts';

export type LengthUnit = 'mm' | 'inch';
export type LengthReading = { status: 'read'; mm: number } | { status: 'unreadable'; message: string };

const UNIT_ENDINGS: [RegExp, number][] = [
  [/\s*(mm|millimet(er|re)s?)$/i, 1],
  [/\s*(cm|centimet(er|re)s?)$/i, 10],
  [/\s*("|\u2033|''|in\.?|inch(es)?)$/i, MM_PER_INCH],
];
const DRILL = /^(?:#\s*(?<number>\d+)|(?:letter|no\.?|number)\s+(?<named>\w+)|(?<letter>[A-Za-z]))$/i;
const MIXED_NUMBER = /(\d+)\s+(\d+\s*\/\s*\d+)/g;

const unreadable = (message: string): LengthReading => ({ status: 'unreadable', message });

/**
 * Reads a length as a maker would type it: `11.1`, `11,1mm`, `7/16 in`, `0.4375"`, `1 3/8"`, `#7`, `letter F`, `12.7/2`.
 *
 * A figure without a unit is in `unit`. Arithmetic with + − * / and brackets is worked out.
 *
 * @returns the length in mm, or a sentence that says what would do
 */
export function readLength(text: string, unit: LengthUnit): LengthReading {
  const typed = text.trim();
  const example =
    unit === 'mm' ? 'Type a size such as 6.5, 6.5 mm or 1/4".' : 'Type a size such as 1/4, 0.25 or 6.5 mm.';
  if (typed === '') return unreadable(example);
  const drill = DRILL.exec(typed);
  if (drill !== null) return readDrill(drill, typed);
  const ending = UNIT_ENDINGS.find(([pattern]) => pattern.test(typed));
  const factor = ending?.[1] ?? (unit === 'mm' ? 1 : MM_PER_INCH);
  const value = evaluate(ending === undefined ? typed : typed.replace(ending[0], ''));
  if (value === null) return unreadable(`Cannot read \u201c${typed}\u201d. ${example}`);
  return { status: 'read', mm: value * factor };
}

function readDrill(match: RegExpExecArray, typed: string): LengthReading {
  const { number, named, letter } = match.groups ?? {};
  const drill = drillByName(number ?? named ?? letter ?? '');
  if (drill === null)
    return unreadable(
      `There is no drill \u201c${typed}\u201d. Number drills run from #1 to #80, letter drills from A to Z.`,
    );
  return { status: 'read', mm: drill.diameterMm };
}

/** The value of an arithmetic expression of plain numbers; null for anything else, so that no name or function is ever called. */
function evaluate(text: string): number | null {
  const expression = text
    .replaceAll('\u2212', '-')
    .replace(/(\d),(\d)/g, '$1.$2')
    .replace(MIXED_NUMBER, '($1+$2)');
  let node: MathNode;
  try {
    node = parse(expression);
  } catch (error) {
    if (error instanceof SyntaxError) return null;
    throw error;
  }
  if (!isPlainArithmetic(node)) return null;
  const value: unknown = node.evaluate();
  return typeof value === 'number' && Number.isFinite(value) ? value : null;
}

function isPlainArithmetic(root: MathNode): boolean {
  let plain = true;
  root.traverse((node) => {
    const isNumber = node.type === 'ConstantNode' && 'value' in node && typeof node.value === 'number';
    const isOperator =
      node.type === 'OperatorNode' && 'op' in node && ['+', '-', '*', '/'].includes(String(node.op));
    const isImplicit = 'implicit' in node && node.implicit === true;
    if (!isNumber && (!isOperator || isImplicit) && node.type !== 'ParenthesisNode') plain = false;
  });
  return plain;
}
