import { memo, useState } from 'react';
import type { DesignSensitivities } from '#shared/analysis/prediction.ts';
import type { Fingering } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { centsPerStep, SENSITIVITY_STEP } from '../../bench/hole-sensitivity.ts';
import { NoteName } from '../../bench/NoteName.tsx';
import { Button } from '../../ui/Button.tsx';

interface EveryNoteProps {
  /** Where the hole stands in the document. */
  index: number;
  hasUndercut: boolean;
  fingerings: readonly Fingering[];
  sensitivities: DesignSensitivities | null;
  unit: LengthUnit;
  /** The note whose row is set off. */
  leading: string | undefined;
}

const SIZES = [
  { key: 'positionMm', head: 'Footward' },
  { key: 'diameterMm', head: 'Wider' },
  { key: 'chimneyMm', head: 'Higher' },
  { key: 'undercut.innerDiameterMm', head: 'Undercut' },
] as const;

/** What one small step of each size of a hole does to every note, not only to the one that it vents. */
export const EveryNote = memo(function EveryNote(props: EveryNoteProps) {
  const { index, hasUndercut, fingerings, sensitivities, unit, leading } = props;
  const [isOpen, setOpen] = useState(false);
  const step = SENSITIVITY_STEP[unit];
  const sizes = SIZES.filter(({ key }) => hasUndercut || !key.startsWith('undercut'));
  return (
    <div className="border-hair border-t pt-1">
      <Button
        look="bare"
        size="small"
        className="-ml-3"
        aria-expanded={isOpen}
        onClick={() => setOpen(!isOpen)}
      >
        {isOpen ? 'Hide what it does to every note' : 'What it does to every note'}
      </Button>
      {isOpen && (
        <table className="is-predicted text-data mb-2 w-full">
          <caption className="text-small text-ink3 pb-1 text-left">Cents per {step.label}</caption>
          <thead>
            <tr className="text-small text-ink3">
              <th scope="col" className="text-left font-normal">
                Note
              </th>
              {sizes.map(({ key, head }) => (
                <th key={key} scope="col" className="text-right font-normal">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {fingerings.map(({ id, note }) => (
              <tr key={id} className={id === leading ? 'bg-mark-soft' : undefined}>
                <th scope="row" className="border-hair border-t text-left font-semibold">
                  <NoteName note={note} />
                </th>
                {sizes.map(({ key }) => (
                  <td key={key} className="border-hair border-t text-right">
                    {figure(centsPerStep(sensitivities, id, `holes.${index}.${key}`, step.mm))}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </div>
  );
});

const figure = (cents: number | null) => (cents === null ? '…' : formatCents(cents));
