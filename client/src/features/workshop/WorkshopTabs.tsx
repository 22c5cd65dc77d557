import { NavLink } from 'react-router';
import { classNames } from '../../ui/class-names.ts';

interface WorkshopTabsProps {
  tabs: readonly { to: string; label: string }[];
}

export function WorkshopTabs({ tabs }: WorkshopTabsProps) {
  return (
    <nav aria-label="Workshop settings" className="border-hair px-margin border-b">
      <ul className="-ml-3.5 flex">
        {tabs.map(({ to, label }) => (
          <li key={to}>
            <NavLink
              to={to}
              className={({ isActive }) =>
                classNames(
                  'target relative flex items-center px-3.5 no-underline',
                  isActive
                    ? 'text-mark after:bg-mark font-semibold after:absolute after:inset-x-3.5 after:-bottom-px after:h-0.75'
                    : 'text-ink2 hover:text-ink',
                )
              }
            >
              {label}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
