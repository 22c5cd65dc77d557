import { cell, type Cells } from '../complex/cells.ts';
import type { Air } from '../air/air.ts';
import { wallFunction } from './bessel-ratio.ts';

/** An air whose walls take nothing: viscosity and heat conduction left out. */
export interface Medium extends Air {
  lossless: boolean;
}

/** Cells that an air takes: wavenumber, ρc, shear wavenumber, thermal wavenumber, γ − 1. */
export const MEDIUM_CELLS = 5;

/** Cells that a duct takes: propagation constant and characteristic impedance, real and imaginary parts. */
export const DUCT_CELLS = 4;

const wall = new Float64Array(4);

/**
 * Writes what an air is at one frequency.
 *
 * @param cells - where to write
 * @param at - address of the air
 * @param medium - the air
 * @param frequency - Hz, > 0
 * @returns nothing; the result is in the cells
 */
export function writeMedium(cells: Cells, at: number, medium: Medium, frequency: number): void {
  const angular = 2 * Math.PI * frequency;
  const shear = medium.lossless ? 0 : Math.sqrt((angular * medium.density) / medium.viscosity);
  cells[at] = angular / medium.speedOfSound;
  cells[at + 1] = medium.density * medium.speedOfSound;
  cells[at + 2] = shear;
  cells[at + 3] = shear * Math.sqrt(medium.prandtl);
  cells[at + 4] = medium.heatCapacityRatio - 1;
}

/**
 * Writes propagation constant Γ (1/m) and characteristic impedance Zc (Pa·s/m³) of a round duct, friction and heat
 * exchange at its wall included by the exact Bessel functions.
 *
 * Holds for a smooth, rigid, heat-keeping wall and boundary layers of any thickness. Real wood loses somewhat more.
 *
 * @param cells - where air and duct lie
 * @param at - address of the duct
 * @param medium - address of the air, see `writeMedium`
 * @param radius - m, > 0
 * @returns nothing; the result is in the cells
 * @source C. Zwikker and C. W. Kosten, Sound Absorbing Materials (1949); D. H. Keefe, J. Acoust. Soc. Am. 75 (1984) 58
 */
export function writeDuct(cells: Cells, at: number, medium: number, radius: number): void {
  const k = cell(cells, medium);
  const z0 = cell(cells, medium + 1) / (Math.PI * radius * radius);
  const shear = cell(cells, medium + 2);
  if (shear === 0) {
    cells[at] = 0;
    cells[at + 1] = k;
    cells[at + 2] = z0;
    cells[at + 3] = 0;
    return;
  }
  wall[0] = shear * radius;
  wallFunction(wall, 0);
  wall[2] = cell(cells, medium + 3) * radius;
  wallFunction(wall, 2);
  // Zv = j·k·z0·P and Yt = j·k·Q/z0 with P = 1/(1 − F(friction)) and Q = 1 + (γ − 1)·F(heat).
  const fr = 1 - cell(wall, 0);
  const fi = -cell(wall, 1);
  const norm = 1 / (fr * fr + fi * fi);
  const pr = fr * norm;
  const pi = -fi * norm;
  const excess = cell(cells, medium + 4);
  const qr = 1 + excess * cell(wall, 2);
  const qi = excess * cell(wall, 3);
  const re = pr * qr - pi * qi;
  const im = pr * qi + pi * qr;
  // Γ = j·k·√(PQ), Zc = z0·P/√(PQ); the root's imaginary part is negative, so Γ decays.
  const u = Math.sqrt((Math.sqrt(re * re + im * im) + re) / 2);
  const v = im / (2 * u);
  cells[at] = -k * v;
  cells[at + 1] = k * u;
  const scale = z0 / (u * u + v * v);
  cells[at + 2] = (pr * u + pi * v) * scale;
  cells[at + 3] = (pi * u - pr * v) * scale;
}
