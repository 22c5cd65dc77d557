import type { ReactNode } from 'react';
import { StateTag, type RevisionState } from '../../bench/StateDisc.tsx';
import { SideMark } from './SideMark.tsx';

export interface ComparedDesign {
  name: string;
  revision: number;
  state: RevisionState;
}

interface CompareHeaderProps {
  a: ComparedDesign;
  b: ComparedDesign;
  /** What one design is beside itself: `itself, in F5`; null where the two are two. */
  itself: string | null;
  /** Quiet ones, then the primary. */
  actions: ReactNode;
}

/** Which two are over each other, and what can be done with them. */
export function CompareHeader({ a, b, itself, actions }: CompareHeaderProps) {
  const isSelf = itself !== null;
  return (
    <header className="bg-sheet px-margin flex min-h-14 flex-wrap items-center gap-x-5 gap-y-2 py-2">
      <h1 className="flex min-w-0 flex-wrap items-baseline gap-x-3.5 gap-y-1 font-[inherit]">
        <span className="sr-only">Compare </span>
        <Named design={a} side={isSelf ? null : 'a'} />
        <span className="text-ink3 text-body">{isSelf ? `against ${itself}` : 'against'}</span>
        {!isSelf && <Named design={b} side="b" />}
      </h1>
      <div className="ml-auto flex flex-wrap items-center justify-end gap-2">{actions}</div>
    </header>
  );
}

function Named({
  design: { name, revision, state },
  side,
}: {
  design: ComparedDesign;
  side: 'a' | 'b' | null;
}) {
  return (
    <span className="inline-flex min-w-0 flex-wrap items-baseline gap-x-2.5">
      {side !== null && <SideMark side={side} label={side.toUpperCase()} />}
      <span className="text-title max-[699px]:text-section min-w-0 font-semibold break-words">{name}</span>
      <StateTag state={state}>{`rev ${revision}`}</StateTag>
    </span>
  );
}
