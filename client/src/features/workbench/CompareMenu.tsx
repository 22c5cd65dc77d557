import { Link } from 'react-router';
import { Button } from '../../ui/Button.tsx';
import { Menu, MenuItem } from '../../ui/Menu.tsx';

interface CompareMenuProps {
  places: readonly { to: string; label: string }[];
  /** Why nothing can be compared now, or null. */
  refusal: string | null;
}

/** What this design can be held against. */
export function CompareMenu({ places, refusal }: CompareMenuProps) {
  if (refusal !== null) {
    return (
      <Button look="bare" className="px-2.5 max-[899px]:hidden" disabled title={refusal}>
        Compare
      </Button>
    );
  }
  return (
    <Menu
      trigger={
        <Button look="bare" className="px-2.5 max-[899px]:hidden">
          Compare
        </Button>
      }
    >
      {places.map(({ to, label }) => (
        <MenuItem key={to} asChild>
          <Link to={to}>{label}</Link>
        </MenuItem>
      ))}
    </Menu>
  );
}
