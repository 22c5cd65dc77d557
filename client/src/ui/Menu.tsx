import { Slot } from 'radix-ui';
import { useState, type KeyboardEvent } from 'react';
import { NoLineError } from '../lib/api-problem.ts';
import type { MenuChoiceProps, MenuItemProps, MenuProps } from './menu-parts.tsx';
import { classNames } from './class-names.ts';
import { Problem } from './Problem.tsx';

type Parts = typeof import('./menu-parts.tsx');

let parts: Parts | null = null;

/**
 * Fetches what menus are made of: a seventh of the first load, and few first visits open one. The workbench fetches it with
 * itself, so that a menu there opens without a line, too.
 */
export async function fetchMenuParts(): Promise<Parts> {
  parts ??= await import('./menu-parts.tsx');
  return parts;
}

function fetchedParts(): Parts {
  if (parts === null) throw new Error('A row of a menu stands outside its Menu.');
  return parts;
}

/** A list of verbs or places under a button. */
export function Menu(props: MenuProps) {
  const [isFetched, setFetched] = useState(parts !== null);
  const [opensAtOnce, setOpensAtOnce] = useState(false);
  const [failure, setFailure] = useState<unknown>(null);
  if (isFetched) {
    const { OpenableMenu } = fetchedParts();
    return <OpenableMenu {...props} defaultOpen={opensAtOnce} />;
  }
  const open = () => {
    setFailure(null);
    fetchMenuParts().then(
      () => {
        setOpensAtOnce(true);
        setFetched(true);
      },
      (cause: unknown) => setFailure(new NoLineError(cause)),
    );
  };
  return (
    <span className="relative inline-flex">
      <Slot.Root
        aria-haspopup="menu"
        aria-expanded={false}
        onClick={open}
        onKeyDown={(event: KeyboardEvent) => {
          if (event.key === 'ArrowDown') open();
        }}
      >
        {props.trigger}
      </Slot.Root>
      <span
        className={classNames(
          'bg-sheet absolute top-full z-30 w-72',
          props.align === 'start' ? 'left-2' : 'right-0',
        )}
      >
        <Problem error={failure} />
      </span>
    </span>
  );
}

export function MenuItem(props: MenuItemProps) {
  const { MenuItem: Item } = fetchedParts();
  return <Item {...props} />;
}

/** One of a few, chosen inside a menu. */
export function MenuChoice(props: MenuChoiceProps) {
  const { MenuChoice: Choice } = fetchedParts();
  return <Choice {...props} />;
}

export function MenuDivider() {
  const { MenuDivider: Divider } = fetchedParts();
  return <Divider />;
}
