import type { ListDesignsQuery } from '#shared/contract/designs.ts';
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
    <label className="text-data text-ink3 desk:hidden flex items-center gap-2">
      Order
      <select
        value={`${list.sort} ${list.order}`}
        onChange={(event) => handleChange(event.currentTarget.value)}
        className="rounded-control border-line bg-sheet text-ink target border px-2"
      >
        {CHOICES.map(([key, label]) => (
          <option key={key} value={key}>
            {label}
          </option>
        ))}
      </select>
    </label>
  );
}
