import { NavLink } from 'react-router';
import { classNames } from '../../ui/class-names.ts';

export interface PanelLink {
  to: string;
  label: string;
}

/** The panels: a strip under the header where there is room, else along the bottom edge where thumbs are. */
export function PanelLinks({ links, atBottom }: { links: readonly PanelLink[]; atBottom: boolean }) {
  return (
    <nav
      aria-label="Panels"
      className={classNames(
        'bg-sheet flex',
        atBottom ? 'border-hair fixed inset-x-0 bottom-0 z-30 h-15 border-t' : '-ml-3.5 h-full',
      )}
    >
      {links.map(({ to, label }) => (
        <NavLink
          key={label}
          to={to}
          preventScrollReset
          className={({ isActive }) =>
            classNames(
              'text-body relative flex items-center justify-center px-3.5 no-underline',
              atBottom && 'flex-1 text-[16px]',
              isActive
                ? 'text-mark after:bg-mark font-semibold after:absolute after:h-0.75'
                : 'text-ink2 hover:text-ink',
              atBottom ? 'after:inset-x-0 after:-top-px' : 'after:inset-x-3.5 after:-bottom-px',
            )
          }
        >
          {label}
        </NavLink>
      ))}
    </nav>
  );
}
