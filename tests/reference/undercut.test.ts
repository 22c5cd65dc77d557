import { describe, expect, it } from 'vitest';
import { curvedLidHeight } from '#shared/acoustics/tone-hole/closed-lid.ts';
import { innerLength } from '#shared/acoustics/tone-hole/inner-length.ts';
import { matchingLength } from '#shared/acoustics/tone-hole/matching-length.ts';
import { radiationLength } from '#shared/acoustics/tone-hole/radiation-length.ts';
import { closedSeriesLength, openSeriesLength } from '#shared/acoustics/tone-hole/series-length.ts';
import { undercutShape, type ShapedUndercut, type Undercut } from '#shared/acoustics/tone-hole/undercut.ts';
import { closedConeSusceptance, closedCylinderSusceptance } from './lossless-chimney.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/undercut.json' with { type: 'json' };

const rows = tableRows(table.columns, table.rows);
const shaped = rows.filter((row) => !row.isIn('set', ['refused']));
const FITTED = 5e-4;

/** The bore's radius is 1. */
function undercutOf(row: TableRow): Undercut {
  const b = row.number('b/a');
  const chimney = row.number('t/b') * b;
  return {
    boreRadius: 1,
    holeRadius: b,
    chimney,
    outerRadius: 1 + chimney,
    flare: row.number('u/b') * b,
    depth: row.number('du/t') * chimney,
  };
}

function shapeOf(hole: Undercut): ShapedUndercut {
  const shape = undercutShape(hole);
  if (shape.status !== 'shaped') throw new Error(`refused: ${shape.reason}`);
  return shape;
}

const rms = (column: string, quantity: (row: TableRow) => number, some = shaped) =>
  spreadOf(some.map((row) => relative(quantity(row), row.number(column))));

describe('undercut holes', () => {
  it('refuses every shape whose cone runs out of the bore', () => {
    const refused = rows.filter((row) => row.isIn('set', ['refused']));
    expect(refused).toHaveLength(6);
    for (const row of refused) expect(undercutShape(undercutOf(row)).status).toBe('refused');
  });

  it.each([
    ['zs', openShunt, { rms: 0.0046, max: 0.0165 }],
    ['ta_open', (row: TableRow) => seriesLength(row, openSeriesLength), { rms: 0.0213, max: 0.051 }],
    ['ta_closed', (row: TableRow) => seriesLength(row, closedSeriesLength), { rms: 0.0229, max: 0.072 }],
    ['zs_closed_k15', closedShunt, { rms: 0.0049, max: 0.0186 }],
    ['vol', volume, { rms: 0.0039, max: 0.0148 }],
  ] as const)('have %s as fitted and as the finite elements', (name, quantity, stated) => {
    expect(rms(`${name}_fit`, quantity).max).toBeLessThan(FITTED);
    expect(rms(`${name}_fem`, quantity).rms).toBeLessThan(stated.rms);
    expect(rms(`${name}_fem`, quantity).max).toBeLessThan(stated.max);
  });

  it('hold for shapes that no one had looked at when the rules were made', () => {
    const blind = shaped.filter((row) => row.isIn('set', ['val2']));
    expect(blind).toHaveLength(24);
    expect(rms('zs_fem', openShunt, blind).max).toBeLessThan(0.01);
    expect(rms('zs_closed_k15_fem', closedShunt, blind).max).toBeLessThan(0.008);
  });
});

/** Low-frequency open shunt in hole radii, over the impedance of the outside radius. */
function openShunt(row: TableRow): number {
  const hole = undercutOf(row);
  const shape = shapeOf(hole);
  const { boreRadius: a, holeRadius: b, chimney, depth, outerRadius } = hole;
  const inner = innerLength(a, shape.innerRadius, chimney) + matchingLength(a, shape.innerRadius);
  return (
    (inner * (b / shape.innerRadius) ** 2 +
      (depth * b * b) / (shape.innerRadius * shape.rimRadius) +
      (chimney - depth) +
      shape.openExtraLength +
      radiationLength(shape.rimRadius, outerRadius) * (b / shape.rimRadius) ** 2) /
    b
  );
}

function seriesLength(row: TableRow, length: typeof openSeriesLength): number {
  const hole = undercutOf(row);
  const { seriesRadius } = shapeOf(hole);
  const own = length(hole.boreRadius, seriesRadius, hole.chimney);
  return (own * (hole.holeRadius / seriesRadius) ** 2) / hole.holeRadius;
}

/** Closed shunt over j·k·Z0h·b at wavenumber·bore radius 0.15, lossless. */
function closedShunt(row: TableRow): number {
  const k = 0.15;
  const hole = undercutOf(row);
  const shape = shapeOf(hole);
  const { boreRadius: a, holeRadius: b, depth } = hole;
  const straight = closedHeight(hole) - depth;
  let y = closedCylinderSusceptance({ k, radius: b, length: straight, beyond: 0 });
  y = closedConeSusceptance({ k, inner: shape.closedRadius, outer: b, length: depth, beyond: y });
  const matching = matchingLength(a, shape.closedRadius);
  y = closedCylinderSusceptance({ k, radius: shape.closedRadius, length: matching, beyond: y });
  const mass = innerLength(a, shape.innerRadius, hole.chimney) / (Math.PI * shape.innerRadius ** 2);
  return ((mass - 1 / (y * k)) * Math.PI * b * b) / b;
}

function volume(row: TableRow): number {
  const hole = undercutOf(row);
  const { closedRadius } = shapeOf(hole);
  const { boreRadius: a, holeRadius: b, depth } = hole;
  const cone = (depth * (closedRadius ** 2 + closedRadius * b + b * b)) / 3;
  const straight = (closedHeight(hole) - depth) * b * b;
  return (matchingLength(a, closedRadius) * closedRadius ** 2 + cone + straight) / b ** 3;
}

function closedHeight({ chimney, holeRadius, outerRadius }: Undercut): number {
  return curvedLidHeight(chimney, holeRadius, outerRadius);
}
