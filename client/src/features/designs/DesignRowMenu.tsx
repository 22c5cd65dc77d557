import { useState } from 'react';
import { Link } from 'react-router';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { Menu, MenuDivider, MenuItem } from '../../ui/Menu.tsx';
import { Problem } from '../../ui/Problem.tsx';
import { useArchiveDesign, useCopyDesign, useRenameDesign } from './designs.queries.ts';
import { NameDialog } from './NameDialog.tsx';

/** Why this person may not copy, rename or archive; null when they may. */
export interface RackRefusals {
  copy: string | null;
  edit: string | null;
}

interface DesignRowMenuProps {
  design: DesignSummary;
  to: string;
  refusals: RackRefusals;
}

/** What can be done with a design from the rack. Putting it away is undone by taking it back, so it is not asked about. */
export function DesignRowMenu({ design, to, refusals }: DesignRowMenuProps) {
  const [naming, setNaming] = useState<'copy' | 'rename' | null>(null);
  const copy = useCopyDesign();
  const rename = useRenameDesign();
  const archive = useArchiveDesign();
  const close = () => setNaming(null);
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
      <Problem error={archive.error} />
      <NameDialog
        title="Copy this design"
        description={`A draft of your own that begins as ${design.name}.`}
        verb="Copy"
        name={`${design.name}, copy`}
        open={naming === 'copy'}
        mutation={copy}
        onClose={close}
        onName={(name) => copy.mutate({ id: design.id, name }, { onSuccess: close })}
      />
      <NameDialog
        title="Rename this design"
        verb="Rename"
        name={design.name}
        open={naming === 'rename'}
        mutation={rename}
        onClose={close}
        onName={(name) => rename.mutate({ id: design.id, name }, { onSuccess: close })}
      />
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
