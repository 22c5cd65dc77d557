import { Link } from 'react-router';
import { themePreference } from '../lib/preferences.ts';
import { THEME_CHOICES, type ThemeChoice } from '../lib/theme.ts';
import { openKeyboardHelp } from './KeyboardHelp.tsx';
import { Menu, MenuChoice, MenuDivider, MenuItem } from './Menu.tsx';
import { PersonMark } from './PersonMark.tsx';

interface PersonMenuProps {
  personName: string;
  workshopName: string;
  accountPath: string;
  workshopPath: string;
  isSigningOut: boolean;
  onSignOut: () => void;
}

/** Workshop and person, at the right of every page: settings, theme, help, the way out. */
export function PersonMenu({ personName, workshopName, isSigningOut, onSignOut, ...paths }: PersonMenuProps) {
  const theme = themePreference.use();
  const trigger = (
    <button
      type="button"
      aria-label={`${personName}: account, theme, help, sign out`}
      className="rounded-disc -mr-1.75 flex size-11 items-center justify-center"
    >
      <PersonMark name={personName} />
    </button>
  );
  return (
    <>
      <Link
        to={paths.workshopPath}
        className="text-ink2 hover:text-ink target max-tablet:hidden max-w-60 content-center truncate no-underline hover:underline"
      >
        {workshopName}
      </Link>
      <Menu trigger={trigger}>
        <p className="px-4 pt-2 pb-1">
          <span className="block font-semibold">{personName}</span>
          <span className="text-data text-ink3 block">{workshopName}</span>
        </p>
        <MenuDivider />
        <MenuItem asChild>
          <Link to={paths.accountPath}>Account</Link>
        </MenuItem>
        <MenuItem asChild>
          <Link to={paths.workshopPath}>Workshop</Link>
        </MenuItem>
        <MenuItem onSelect={openKeyboardHelp}>Help: keys</MenuItem>
        <MenuDivider />
        <MenuChoice
          label="Theme"
          value={theme}
          options={THEME_CHOICES}
          onChange={(value) => themePreference.choose(value as ThemeChoice)}
        />
        <MenuDivider />
        <MenuItem disabled={isSigningOut} onSelect={onSignOut}>
          Sign out
        </MenuItem>
      </Menu>
    </>
  );
}
