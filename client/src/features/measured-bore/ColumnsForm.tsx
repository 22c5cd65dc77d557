import {
  COLUMN_KINDS,
  type ColumnKind,
  type MeasurementColumn,
} from '#shared/measured-bore/measurement-columns.ts';
import { COLUMN_UNITS, type ColumnUnit } from '#shared/measured-bore/measurement-cell.ts';
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
      <div
        key={index}
        className="border-hair flex min-h-9 items-center gap-2 border-t py-0.5 @max-[460px]:flex-wrap"
      >
        <span className="flex min-w-0 flex-1 items-baseline gap-3 @max-[460px]:basis-full">
          <span className="text-data text-ink2 shrink-0 whitespace-nowrap">{name}</span>
          <span className="text-label text-ink3 min-w-0 truncate" title={title ?? undefined}>
            {title}
          </span>
        </span>
        <span className="w-29 shrink-0 @max-[460px]:flex-1">
          <SmallSelect
            label={`${name} holds`}
            value={kind}
            options={KINDS}
            onChange={(chosen) => onChange(index, { kind: chosen })}
          />
        </span>
        <span className="w-20 shrink-0 @max-[460px]:w-26">
          {kind !== 'unused' && (
            <SmallSelect
              label={`Unit of column ${index + 1}`}
              value={unit}
              options={UNITS}
              onChange={(chosen) => onChange(index, { unit: chosen })}
            />
          )}
        </span>
      </div>
    );
  });
}
