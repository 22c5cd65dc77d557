import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Button } from '../../ui/Button.tsx';
import { Menu, MenuItem } from '../../ui/Menu.tsx';

interface SheetMenuProps {
  designId: number;
  unit: LengthUnit;
  /** Why no sheet can be had now, or null: it is printed from what the workshop has stored. */
  refusal: string | null;
}

const PAPERS = ['A4', 'Letter'] as const;

/** The drilling sheet at full scale, on the paper that is in the printer. */
export function SheetMenu({ designId, unit, refusal }: SheetMenuProps) {
  if (refusal !== null) {
    return (
      <Button look="go" disabled title={refusal}>
        Print sheets
      </Button>
    );
  }
  return (
    <Menu trigger={<Button look="go">Print sheets</Button>}>
      {PAPERS.map((paper) => (
        <MenuItem key={paper} asChild>
          <a
            href={`/api/designs/${designId}/draft/sheet.pdf?paper=${paper}&unit=${unit}`}
            target="_blank"
            rel="noreferrer"
          >
            On {paper}
          </a>
        </MenuItem>
      ))}
    </Menu>
  );
}
