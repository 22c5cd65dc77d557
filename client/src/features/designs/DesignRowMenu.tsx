import { lazy, Suspense, useState } from 'react';
import { Link } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { Menu, MenuDivider, MenuItem } from '../../ui/Menu.tsx';
import { Problem } from '../../ui/Problem.tsx';
import { useArchiveDesign, useCopyDesign, useRenameDesign } from './designs.queries.ts';

/** Why this person may not copy, rename or archive; null when they may. */
export interface RackRefusals {
  copy: string | null;
  edit: string | null;
}

/** Fetched when something is first named. */
const NameDialog = lazy(async () => ({ default: (await import('./NameDialog.tsx')).NameDialog }));

const NAMINGS = {
  copy: ({ name }: DesignSummary) => ({
    title: 'Copy this design',
    description: `A draft of your own that begins as ${name}.`,
    verb: 'Copy',
    name: `${name}, copy`,
  }),
  rename: ({ name }: DesignSummary) => ({ title: 'Rename this design', verb: 'Rename', name }),
};

interface DesignRowMenuProps {
  design: DesignSummary;
  to: string;
  compareTo: string;
  refusals: RackRefusals;
}

/** What can be done with a design from the rack. Putting it away is undone by taking it back, so it is not asked about. */
export function DesignRowMenu({ design, to, compareTo, refusals }: DesignRowMenuProps) {
  const [naming, setNaming] = useState<keyof typeof NAMINGS | null>(null);
  const copy = useCopyDesign();
  const rename = useRenameDesign();
  const archive = useArchiveDesign();
  const mutation = naming === 'copy' ? copy : rename;
  const close = () => setNaming(null);
  const handleName = (name: string) => mutation.mutate({ id: design.id, name }, { onSuccess: close });
  const trigger = (
    <button
      type="button"
      aria-label={`More about ${design.name}`}
      className="rounded-control text-ink2 hover:text-ink flex size-11 items-center justify-center"
    >
      <svg width="18" height="4" viewBox="0 0 18 4" aria-hidden="true" fill="currentColor">
        <circle cx="2" cy="2" r="2" />
        <circle cx="9" cy="2" r="2" />
        <circle cx="16" cy="2" r="2" />
      </svg>
    </button>
  );
  return (
    <>
      <Menu trigger={trigger}>
        <MenuItem asChild>
          <Link to={to}>Open</Link>
        </MenuItem>
        <MenuItem asChild>
          <Link to={compareTo}>Compare…</Link>
        </MenuItem>
        <MenuItem disabled={refusals.copy !== null} onSelect={() => setNaming('copy')}>
          Copy…
        </MenuItem>
        <MenuItem disabled={refusals.edit !== null} onSelect={() => setNaming('rename')}>
          Rename…
        </MenuItem>
        <MenuItem
          disabled={refusals.edit !== null}
          onSelect={() => archive.mutate({ id: design.id, to: design.archived ? 'restore' : 'archive' })}
        >
          {design.archived ? 'Take it back from the archive' : 'Put it in the archive'}
        </MenuItem>
        <MenuReasons refusals={refusals} />
      </Menu>
      <div className="bg-sheet absolute top-full right-0 z-10 w-72">
        <Problem error={archive.error} />
      </div>
      {naming !== null && (
        <Suspense fallback={null}>
          <NameDialog {...NAMINGS[naming](design)} mutation={mutation} onClose={close} onName={handleName} />
        </Suspense>
      )}
    </>
  );
}

/** Why some of the rows above are quiet. */
function MenuReasons({ refusals }: { refusals: RackRefusals }) {
  const reasons = [...new Set([refusals.copy, refusals.edit])].filter((reason) => reason !== null);
  if (reasons.length === 0) return null;
  return (
    <>
      <MenuDivider />
      <p className="text-data text-ink2 max-w-72 px-4 pt-1 pb-2">{reasons.join(' ')}</p>
    </>
  );
}
