import { memo } from 'react';
import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import type { DocumentMatch } from '#shared/document/match-documents.ts';
import { borePath, planHole, planPath, type Place } from '../../bench/body-paths.ts';
import type { BenchFrame } from '../../bench/bench-geometry.ts';
import { drawnBody, type BodyShape } from '../../bench/drawn-body.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { isSameLength } from './hole-changes.ts';
import './compare.css';

interface OldOutlineProps {
  frame: BenchFrame;
  /** The older instrument, and the one drawn solid. */
  old: DesignDocument;
  document: DesignDocument;
  match: DocumentMatch;
  /** How far the older one is shifted along the other. */
  offsetMm: number;
  /** What the older one is called, beside its foot. */
  label: string;
}

/** What differs in the older instrument, as dashed outlines over the drawing: body, bore line and holes. */
export const OldOutline = memo(function OldOutline(props: OldOutlineProps) {
  const { frame, old, document, match, offsetMm } = props;
  const { measures } = frame;
  const x = (positionMm: number) => frame.x(positionMm + offsetMm);
  const plan: Place = { x, across: frame.acrossPxPerMm, axisY: measures.planY };
  const section: Place = { ...plan, axisY: measures.sectionY };
  return (
    <g aria-hidden="true" pointerEvents="none" clipPath="url(#bench-view)">
      {!isSameBody(old, document) && (
        <path d={planPath(old, drawnBody(old), plan)} className="compare-old-outline" />
      )}
      {measures.hasSection && !isSame(old.bore, document.bore) && (
        <path d={borePath(old, section)} className="compare-old-bore" />
      )}
      {match.holes.map((pair) =>
        pair.a === null || isSameHole(pair.a, pair.b) ? null : (
          <OldHole key={pair.a.id} shape={old} hole={pair.a} place={plan} />
        ),
      )}
      <OldFoot {...props} />
    </g>
  );
});

function OldHole({ shape, hole, place }: { shape: BodyShape; hole: ToneHole; place: Place }) {
  const { cx, cy, rx, ry } = planHole(shape, hole, place);
  const outline = { cx, cy, rx, ry };
  return (
    <>
      <ellipse {...outline} className="compare-old-hole-gaps" />
      <ellipse {...outline} className="compare-old-hole" />
    </>
  );
}

function OldFoot({ frame, old, document, offsetMm, label }: OldOutlineProps) {
  const [footMm, newFootMm] = [boreEnds(old).footMm + offsetMm, boreEnds(document).footMm];
  const x = frame.x(footMm);
  if (isSameLength(footMm, newFootMm) || Math.abs(x - frame.x(newFootMm)) < 46) return null;
  return (
    <text x={x - 4} y={17} textAnchor="end" className="bench-quiet-label">
      foot, {label}
    </text>
  );
}

const isSame = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

const isSameBody = (a: DesignDocument, b: DesignDocument) =>
  isSame(a.outside, b.outside) && isSame(boreEnds(a), boreEnds(b)) && a.mouthEnd.kind === b.mouthEnd.kind;

const isSameHole = (a: ToneHole, b: ToneHole | null) =>
  b !== null &&
  isSameLength(a.positionMm, b.positionMm) &&
  isSameLength(a.diameterMm, b.diameterMm) &&
  a.angleDeg === b.angleDeg;
