import type { ReactNode } from 'react';
import { Link } from 'react-router';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Segment } from '../../ui/Segment.tsx';

interface ConditionsProps {
  document: Pick<DesignDocument, 'air' | 'pitch'>;
  bandCents: readonly number[];
  unit: LengthUnit;
  saveNote: ReactNode;
  airTo: string;
  pitchTo: string;
  bandTo: string;
  onUnit: (unit: LengthUnit) => void;
}

const UNITS = [
  { value: 'mm', label: 'mm' },
  { value: 'inch', label: 'inch' },
] as const;

/** Under what air, pitch and band the figures hold; each leads to where it is set. */
export function Conditions(props: ConditionsProps) {
  const { document, bandCents, unit, saveNote, airTo, pitchTo, bandTo, onUnit } = props;
  const { air, pitch } = document;
  const temperature = air.temperatureC.toFixed(Number.isInteger(air.temperatureC) ? 0 : 1);
  const isOneBand = bandCents.every((cents) => cents === bandCents[0]);
  const band = isOneBand ? String(bandCents[0] ?? '') : bandCents.join(', ');
  return (
    <div className="text-data text-ink3 ml-auto flex items-center gap-5.5">
      <Condition to={airTo} label="Air" figure={air.fixed === null ? `${temperature} °C` : 'fixed'} />
      <Condition to={pitchTo} label="A" figure={`${pitch.a4Hz} Hz`} />
      {pitch.temperament !== 'equal' && (
        <Condition to={pitchTo} label="Scale" figure={pitch.temperament.replaceAll('-', ' ')} />
      )}
      <Condition to={bandTo} label="Band" figure={`±${band} cents`} />
      {saveNote}
      <Segment label="Unit" size="small" value={unit} options={UNITS} onChange={onUnit} />
    </div>
  );
}

/** While something is only held against the design. */
export function TrialConditions({ unit, onUnit }: Pick<ConditionsProps, 'unit' | 'onUnit'>) {
  return (
    <div className="text-data text-ink3 ml-auto flex items-center gap-5.5">
      <span>Nothing is changed until you choose</span>
      <Segment label="Unit" size="small" value={unit} options={UNITS} onChange={onUnit} />
    </div>
  );
}

function Condition({ to, label, figure }: { to: string; label: string; figure: string }) {
  return (
    <Link to={to} className="text-ink3 hover:text-ink no-underline" preventScrollReset>
      {label} <b className="text-ink font-semibold">{figure}</b>
    </Link>
  );
}
