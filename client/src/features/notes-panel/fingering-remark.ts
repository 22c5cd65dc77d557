import type { DesignDocument, Fingering } from '#shared/document/design-document.ts';
import { holeMark } from '../../bench/fingering-marks.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';

/** What is special about a fingering, in two or three words; empty for the plain ones. */
export function fingeringRemark(
  fingering: Fingering,
  holes: readonly LabelledHole[],
  kind: DesignDocument['mouthEnd']['kind'],
): string {
  const half = holes.filter(({ hole }) => holeMark(fingering, hole) === 'half');
  if (half.length > 0) return `half-cover ${half.map(({ label }) => label).join(' ')}`;
  const fingers = holes.filter(({ hole }) => hole.cover !== 'vent' && hole.cover !== 'thumb');
  const marks = fingers.map(({ hole }) => holeMark(fingering, hole));
  const firstOpen = marks.indexOf('open');
  const coveredBelow =
    firstOpen >= 0 ? marks.slice(firstOpen).filter((mark) => mark === 'covered').length : 0;
  if (coveredBelow === 0) return '';
  const ventsOnly = firstOpen === 0 && marks.slice(1).every((mark) => mark === 'covered');
  if (ventsOnly && fingering.register > 1) return kind === 'reed' ? 'vented twelfth' : 'vented octave';
  return 'cross';
}
