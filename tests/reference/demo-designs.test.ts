import { readFileSync, readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { predictDesign } from '#shared/analysis/predict-design.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { readDocument } from '#shared/document/read-document.ts';
import workshop from '../../seed-data/workshop.json' with { type: 'json' };

const FOLDER = new URL('../../seed-data/designs/', import.meta.url);
const BAND_CENTS = 15;

function readDesign(file: string): DesignDocument {
  const reading = readDocument(JSON.parse(readFileSync(new URL(file, FOLDER), 'utf8')));
  if (reading.status !== 'read') throw new Error(reading.faults.map((fault) => fault.message).join(' '));
  return reading.document;
}

const files = readdirSync(FOLDER);

describe('demo workshop', () => {
  it('loads every design that lies in its folder', () => {
    expect(workshop.designs.map((design) => design.file).sort()).toEqual([...files].sort());
  });

  it('has somebody in every role', () => {
    expect(new Set(workshop.people.map((person) => person.role))).toEqual(
      new Set(['owner', 'mentor', 'maker', 'apprentice', 'visitor']),
    );
  });

  it('has every kind of mouth end and foot that makers ask about', () => {
    const designs = files.map(readDesign);
    expect(new Set(designs.map((design) => design.mouthEnd.kind))).toEqual(
      new Set(['window', 'embouchure', 'rim', 'reed']),
    );
    expect(designs.some((design) => design.foot.kind === 'stopped')).toBe(true);
    expect(designs.some((design) => design.holes.some((hole) => hole.cover === 'thumb'))).toBe(true);
  });
});

describe.each(files)('demo design %s', (file) => {
  const design = readDesign(file);
  const prediction = predictDesign(design);

  it('is in tune within 15 cents in its first and second register, with nothing bent to make it so', () => {
    expect(design.pitch.temperament).toBe('equal');
    expect(design.mouthEnd.correctionScale).toBe(1);
    for (const fingering of design.fingerings) {
      expect(fingering.centsOffset).toBe(0);
      expect(fingering.register).toBeLessThanOrEqual(2);
    }
    const cents = prediction.fingerings.map(
      ({ id, centsFromScale }) => [id, centsFromScale ?? Infinity] as const,
    );
    expect(cents.filter(([, off]) => Math.abs(off) > BAND_CENTS)).toEqual([]);
  });

  it('has holes that a drill makes and hands reach', () => {
    for (const hole of design.holes) {
      expect(hole.diameterMm).toBeGreaterThanOrEqual(4);
      expect(hole.diameterMm).toBeLessThanOrEqual(12);
      // Half-millimetre drills are in every drawer.
      expect((hole.diameterMm * 2) % 1).toBeCloseTo(0, 9);
    }
    for (const hand of ['left', 'right']) {
      const fingers = design.holes
        .filter((hole) => hole.hand === hand && hole.cover === 'finger')
        .map((hole) => hole.positionMm)
        .sort((a, b) => a - b);
      fingers.slice(1).forEach((position, i) => {
        const reach = position - fingers[i]!;
        // Common practice: closer, fingers touch; wider, they do not seal.
        expect(reach).toBeGreaterThanOrEqual(15);
        expect(reach).toBeLessThanOrEqual(38);
      });
    }
  });
});
