import { Link } from 'react-router';
import { paths } from '../paths.ts';
import { Button } from '../ui/Button.tsx';
import { PageTitle } from '../ui/PageTitle.tsx';
import { PlainFrame } from './PlainFrame.tsx';

export function NotFoundPage() {
  return (
    <PlainFrame>
      <NotOnThisPeg />
    </PlainFrame>
  );
}

/** The same words for what does not exist and for what this person may not see, so that neither gives the other away. */
export function NotOnThisPeg() {
  return (
    <div className="px-margin py-10">
      <PageTitle>Nothing here</PageTitle>
      <EmptyPeg />
      <h1 className="text-page mt-6 font-semibold">There is nothing on this peg.</h1>
      <p className="text-ink2 mt-2 mb-6 max-w-140">
        The address is wrong, or what hung here was taken down or is not shared with you. Nothing was changed.
      </p>
      <div className="flex flex-wrap gap-2">
        <Button asChild look="go">
          <Link to={paths.today()}>Today</Link>
        </Button>
        <Button asChild>
          <Link to={paths.designs()}>Designs</Link>
        </Button>
      </div>
    </div>
  );
}

/** A row of pegs, one of them bare: only its shadow line hangs there. */
function EmptyPeg() {
  return (
    <svg width="260" height="92" viewBox="0 0 260 92" aria-hidden="true">
      <rect x="0.5" y="8.5" width="259" height="16" rx="2" fill="var(--w3)" stroke="var(--wood-edge)" />
      {[30, 80, 130, 180, 230].map((x) => (
        <circle key={x} cx={x} cy="16.5" r="5" fill="var(--w2)" stroke="var(--wood-edge)" />
      ))}
      {[30, 80, 180, 230].map((x) => (
        <g key={x}>
          <line x1={x} y1="21" x2={x} y2="64" stroke="var(--ink3)" />
          <path d={`M${x} 60l7 9-7 14-7-14z`} fill="var(--s2)" stroke="var(--steel-edge)" />
        </g>
      ))}
      <line x1="130" y1="22" x2="130" y2="84" stroke="var(--line)" strokeDasharray="2 4" />
    </svg>
  );
}
