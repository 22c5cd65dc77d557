import type { ListDesignsQuery } from '#shared/contract/designs.ts';
import { Select } from '../../ui/Select.tsx';
import { changeList } from './list-address.ts';

const CHOICES = [
  ['changed desc', 'Last changed first'],
  ['changed asc', 'Longest untouched first'],
  ['name asc', 'Name, A to Z'],
  ['name desc', 'Name, Z to A'],
  ['lowest-note asc', 'Lowest note first'],
  ['lowest-note desc', 'Highest note first'],
  ['kind asc', 'By kind'],
] as const;

interface SortSelectProps {
  list: ListDesignsQuery;
  onChange: (list: ListDesignsQuery) => void;
}

/** The order of the rack where its column heads have no room. */
export function SortSelect({ list, onChange }: SortSelectProps) {
  const handleChange = (value: string) => {
    const choice = CHOICES.find(([key]) => key === value);
    if (choice === undefined) return;
    const [sort, order] = choice[0].split(' ') as [ListDesignsQuery['sort'], ListDesignsQuery['order']];
    onChange(changeList(list, { sort, order }));
  };
  return (
    <label className="desk:hidden">
      <span className="sr-only">Order</span>
      <Select
        value={`${list.sort} ${list.order}`}
        onChange={(event) => handleChange(event.currentTarget.value)}
        className="rounded-control border-line bg-sheet text-ink target border pl-3"
      >
        {CHOICES.map(([key, label]) => (
          <option key={key} value={key}>
            {label}
          </option>
        ))}
      </Select>
    </label>
  );
}
