import {
  COLUMN_KINDS,
  type ColumnKind,
  type MeasurementColumn,
} from '#shared/measured-bore/measurement-columns.ts';
import { COLUMN_UNITS, type ColumnUnit } from '#shared/measured-bore/measurement-cell.ts';
import { FormRow } from './FormRow.tsx';
import { SmallSelect } from './SmallSelect.tsx';

interface ColumnsFormProps {
  columns: readonly MeasurementColumn[];
  onChange: (index: number, change: Partial<Pick<MeasurementColumn, 'kind' | 'unit'>>) => void;
}

const KIND_WORDS: Record<ColumnKind, string> = {
  distance: 'distance',
  diameter: 'diameter',
  radius: 'radius',
  unused: 'not used',
};
const KINDS = COLUMN_KINDS.map((value) => ({ value, label: KIND_WORDS[value] }));
const UNITS = COLUMN_UNITS.map((value: ColumnUnit) => ({ value, label: value }));

/** What each column was taken for, and may be said to be. */
export function ColumnsForm({ columns, onChange }: ColumnsFormProps) {
  return columns.map(({ index, title, kind, unit }) => {
    const name = `Column ${index + 1}`;
    return (
      <FormRow key={index} label={name} hint={title}>
        <span className="w-26 shrink-0">
          <SmallSelect
            label={`${name} holds`}
            value={kind}
            options={KINDS}
            onChange={(chosen) => onChange(index, { kind: chosen })}
          />
        </span>
        <span className="w-18 shrink-0">
          {kind !== 'unused' && (
            <SmallSelect
              label={`Unit of column ${index + 1}`}
              value={unit}
              options={UNITS}
              onChange={(chosen) => onChange(index, { unit: chosen })}
            />
          )}
        </span>
      </FormRow>
    );
  });
}
