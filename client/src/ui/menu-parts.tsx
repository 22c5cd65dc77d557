import { DropdownMenu } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

export interface MenuProps {
  /** The button that opens it. */
  trigger: ReactNode;
  align?: 'start' | 'end';
  children: ReactNode;
}

export function OpenableMenu({
  trigger,
  align = 'end',
  defaultOpen,
  children,
}: MenuProps & { defaultOpen: boolean }) {
  return (
    <DropdownMenu.Root defaultOpen={defaultOpen}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align={align}
          sideOffset={6}
          collisionPadding={8}
          className="rounded-control border-hair bg-sheet text-ink shadow-pop z-50 max-h-(--radix-dropdown-menu-content-available-height) min-w-56 overflow-y-auto border py-1"
        >
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

const ITEM =
  'flex w-full cursor-pointer items-center gap-3 px-4 text-left text-body text-ink no-underline outline-none data-disabled:cursor-default data-disabled:text-ink3 data-highlighted:bg-mark-soft target';

export interface MenuItemProps {
  onSelect?: (() => void) | undefined;
  disabled?: boolean;
  look?: 'plain' | 'stop';
  /** Hands the row to the child, for links. */
  asChild?: boolean;
  children: ReactNode;
}

export function MenuItem({
  onSelect,
  disabled = false,
  look = 'plain',
  asChild = false,
  children,
}: MenuItemProps) {
  return (
    <DropdownMenu.Item
      asChild={asChild}
      disabled={disabled}
      {...(onSelect === undefined ? {} : { onSelect })}
      className={classNames(ITEM, look === 'stop' && 'text-stop')}
    >
      {children}
    </DropdownMenu.Item>
  );
}

export interface MenuChoiceProps {
  label: string;
  value: string;
  options: readonly { value: string; label: string }[];
  onChange: (value: string) => void;
}

/** One of a few, chosen inside a menu. */
export function MenuChoice({ label, value, options, onChange }: MenuChoiceProps) {
  return (
    <DropdownMenu.RadioGroup value={value} onValueChange={onChange} aria-label={label}>
      <DropdownMenu.Label className="text-label text-ink3 px-4 pt-2 pb-1">{label}</DropdownMenu.Label>
      {options.map((option) => (
        <DropdownMenu.RadioItem key={option.value} value={option.value} className={ITEM}>
          <span
            aria-hidden="true"
            className={classNames(
              'rounded-disc border-ink2 inline-block size-3 shrink-0 border-[1.5px]',
              option.value === value && 'bg-ink2',
            )}
          />
          {option.label}
        </DropdownMenu.RadioItem>
      ))}
    </DropdownMenu.RadioGroup>
  );
}

export function MenuDivider() {
  return <DropdownMenu.Separator className="border-hair my-1 border-t" />;
}
