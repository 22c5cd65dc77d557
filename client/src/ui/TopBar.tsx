import type { ReactNode } from 'react';
import { Link, NavLink } from 'react-router';
import { classNames } from './class-names.ts';
import { Mark } from './Mark.tsx';
import { Menu, MenuItem } from './Menu.tsx';
import { useTopBarRoom } from './TopBarFill.tsx';

export interface TopBarLink {
  to: string;
  label: string;
}

interface TopBarProps {
  home: string;
  links: readonly TopBarLink[];
  /** Name of the thing in hand; stands beside the menu button where there is no room for links. */
  title: string;
  /** Workshop and person, at the right. */
  right: ReactNode;
}

/** 48 px across every page; at 1024 px and below a menu button and the title of the thing in hand. */
export function TopBar({ home, links, title, right }: TopBarProps) {
  const { setElement, isFilled } = useTopBarRoom();
  return (
    <header className="h-top-bar border-hair bg-sheet px-margin text-ink max-bar:gap-1 max-bar:pl-1 flex items-center border-b">
      <Link
        to={home}
        className="text-ink max-bar:hidden mr-9 flex items-center gap-2.5 text-[17px] font-bold no-underline"
      >
        <Mark />
        Borewright
      </Link>
      <nav aria-label="Main" className="max-bar:hidden h-full">
        <ul className="flex h-full">
          {links.map((link) => (
            <li key={link.to} className="h-full">
              <NavLink to={link.to} className={barLinkLook}>
                {link.label}
              </NavLink>
            </li>
          ))}
        </ul>
      </nav>
      <nav aria-label="Main" className="bar:hidden">
        <NarrowMenu links={links} />
      </nav>
      <div ref={setElement} className="bar:hidden flex min-w-0 flex-1 items-center gap-3">
        {!isFilled && <p className="text-section truncate font-semibold">{title}</p>}
      </div>
      <div
        className={classNames(
          'text-data text-ink2 ml-auto flex items-center gap-4',
          isFilled && 'max-bar:hidden',
        )}
      >
        {right}
      </div>
    </header>
  );
}

function barLinkLook({ isActive }: { isActive: boolean }): string {
  return classNames(
    'relative flex h-full items-center px-3.5 text-body no-underline',
    isActive
      ? 'font-semibold text-ink after:absolute after:inset-x-3.5 after:-bottom-px after:h-0.75 after:bg-ink'
      : 'text-ink2 hover:text-ink',
  );
}

function NarrowMenu({ links }: { links: readonly TopBarLink[] }) {
  const trigger = (
    <button
      type="button"
      aria-label="Menu"
      className="rounded-control flex size-12 items-center justify-center"
    >
      <svg
        width="20"
        height="16"
        viewBox="0 0 20 16"
        aria-hidden="true"
        stroke="currentColor"
        strokeWidth="2"
      >
        <path d="M0 1h20M0 8h20M0 15h20" />
      </svg>
    </button>
  );
  return (
    <Menu trigger={trigger} align="start">
      {links.map((link) => (
        <MenuItem key={link.to} asChild>
          <NavLink to={link.to}>{link.label}</NavLink>
        </MenuItem>
      ))}
    </Menu>
  );
}
