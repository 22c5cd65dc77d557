import type { ReactNode } from 'react';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { useElementWidth } from '../../ui/use-element-width.ts';
import { RackRule } from './RackRule.tsx';

interface EmptyRackProps {
  unit: LengthUnit;
  children: ReactNode;
}

/** One sentence and one thing to do, standing on an empty rule. */
export function EmptyRack({ unit, children }: EmptyRackProps) {
  const [ref, widthPx] = useElementWidth();
  return (
    <div className="py-10">
      <div ref={ref} className="h-7 max-w-160">
        {widthPx !== null && <RackRule unit={unit} scale={{ widthPx, pxPerMm: 0.8 }} />}
      </div>
      <div className="text-ink2 mt-6 grid max-w-140 justify-items-start gap-4">{children}</div>
    </div>
  );
}
