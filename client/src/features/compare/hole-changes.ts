import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { chimneyMm } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { MOUTH_WORDS } from '../../bench/mouth-words.ts';

/** Less than this is no change that anybody could cut or measure, mm. */
export const SAME_WITHIN_MM = 0.005;

export const isSameLength = (a: number, b: number) => Math.abs(a - b) < SAME_WITHIN_MM;

/** A hole with the instrument it is in. */
export interface PlacedHole {
  document: DesignDocument;
  hole: ToneHole;
  /** How far its instrument is shifted along the other, mm. */
  offsetMm?: number;
}

/** What became of a hole, in words: `moved 1.6 mm footward, 7.0 to 7.5 mm`; empty where nothing did. */
export function holeChangeWords(a: PlacedHole, b: PlacedHole, unit: LengthUnit): string {
  const size = (mm: number) => printLength(mm, unit, unit === 'mm' && !isTenth(mm) ? 2 : undefined);
  const name = unit === 'mm' ? 'mm' : 'in';
  return [
    movedWords(a, b, (mm) => `${size(mm)} ${name}`),
    ...fromTo('', a.hole.diameterMm, b.hole.diameterMm, (mm) => size(mm), ` ${name}`),
    ...undercutWords(a.hole, b.hole, size),
    ...chimneyWords(a, b, size),
    a.hole.angleDeg === b.hole.angleDeg ? '' : `turned from ${a.hole.angleDeg}° to ${b.hole.angleDeg}°`,
    a.hole.cover === b.hole.cover ? '' : `${a.hole.cover} to ${b.hole.cover}`,
    a.hole.hand === b.hole.hand ? '' : `${a.hole.hand} to ${b.hole.hand} hand`,
  ]
    .filter((words) => words !== '')
    .join(', ');
}

const isTenth = (mm: number) => isSameLength(mm, Math.round(mm * 10) / 10);

function movedWords(a: PlacedHole, b: PlacedHole, print: (mm: number) => string): string {
  const byMm = b.hole.positionMm - a.hole.positionMm - (a.offsetMm ?? 0);
  if (Math.abs(byMm) < SAME_WITHIN_MM) return '';
  const way = byMm > 0 ? 'footward' : `toward the ${MOUTH_WORDS[b.document.mouthEnd.kind]}`;
  return `moved ${print(Math.abs(byMm))} ${way}`;
}

function fromTo(
  label: string,
  from: number,
  to: number,
  ...[print, suffix]: [(mm: number) => string, string]
): string[] {
  return isSameLength(from, to) ? [] : [`${label}${print(from)} to ${print(to)}${suffix}`];
}

/** A chimney taken from the wall follows bore and outside: that is their change, not the hole's. */
function chimneyWords(a: PlacedHole, b: PlacedHole, print: (mm: number) => string): string[] {
  if (a.hole.chimneyMm === null && b.hole.chimneyMm === null) return [];
  return fromTo('chimney ', chimneyMm(a.document, a.hole), chimneyMm(b.document, b.hole), print, '');
}

function undercutWords(a: ToneHole, b: ToneHole, print: (mm: number) => string): string[] {
  const words = ({ undercut }: ToneHole) =>
    undercut === null ? 'none' : `${print(undercut.innerDiameterMm)}, ${print(undercut.depthMm)} deep`;
  return words(a) === words(b) ? [] : [`undercut ${words(a)} to ${words(b)}`];
}
