import { Slot } from 'radix-ui';
import type { ComponentProps } from 'react';
import { classNames } from './class-names.ts';

export type ButtonLook = 'go' | 'plain' | 'bare' | 'quiet' | 'stop';
export type ButtonSize = 'small' | 'normal' | 'big';

interface ButtonProps extends ComponentProps<'button'> {
  /** `go` is the one primary action of a screen; `quiet` stands in a header, `bare` reads like a link. */
  look?: ButtonLook;
  size?: ButtonSize;
  /** Hands the look to the child, for links that lead to a page. */
  asChild?: boolean;
}

const LOOKS: Record<ButtonLook, string> = {
  go: 'border-mark bg-mark text-mark-ink hover:brightness-110 disabled:border-line disabled:bg-groove disabled:text-ink3',
  plain:
    'border-line bg-sheet text-ink hover:border-ink2 disabled:border-hair disabled:bg-transparent disabled:text-ink3',
  bare: 'border-transparent bg-transparent text-mark hover:underline disabled:text-ink3',
  quiet: 'border-transparent bg-transparent text-ink2 hover:text-ink disabled:text-line',
  stop: 'border-stop bg-sheet text-stop hover:bg-stop-soft disabled:border-hair disabled:text-ink3',
};

const SIZES: Record<ButtonSize, string> = {
  small: 'min-h-8 px-3 text-data pointer-coarse:min-h-12 max-[1100px]:min-h-12',
  normal: 'min-h-10 px-4 text-body pointer-coarse:min-h-12 max-[1100px]:min-h-12 max-[1100px]:text-[16px]',
  big: 'min-h-14 px-6 text-[18px]',
};

export function Button({
  look = 'plain',
  size = 'normal',
  asChild = false,
  className,
  ...rest
}: ButtonProps) {
  const Part = asChild ? Slot.Root : 'button';
  return (
    <Part
      {...(asChild ? {} : { type: 'button' as const })}
      {...rest}
      className={classNames(
        'rounded-control inline-flex items-center justify-center gap-2 border text-center font-semibold no-underline',
        'disabled:cursor-default aria-disabled:cursor-default',
        LOOKS[look],
        SIZES[size],
        className,
      )}
    />
  );
}
