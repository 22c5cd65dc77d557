import { singleKeysPreference } from '../lib/preferences.ts';
import { Dialog } from './Dialog.tsx';

const GROUPS: readonly { title: string; keys: readonly (readonly [string, string])[] }[] = [
  {
    title: 'Everywhere',
    keys: [
      ['?', 'this list'],
      ['/', 'find'],
      ['Esc', 'close what floats, put a field back'],
    ],
  },
  {
    title: 'In a field with a figure',
    keys: [
      ['↑, ↓', 'one step; with Shift ten'],
      ['Enter', 'keep it'],
      ['Esc', 'put it back'],
    ],
  },
  {
    title: 'At the workbench',
    keys: [
      ['1 to 9', 'choose a hole; two figures within 0.6 s for 10 and up'],
      ['0, W, H', 'foot, mouth end, thumb hole'],
      ['←, →', 'next hole toward the window, toward the foot'],
      ['Alt ←, Alt →', 'move the hole, the foot or the mouth end one step; with Shift five'],
      ['Alt ↑, Alt ↓', 'next wider, next narrower drill; with Shift 0.1 mm'],
      ['N, Shift N', 'next, previous note'],
      ['R', 'show register 1, 2, 3, all'],
      ['Space', 'play the reference note, and stop it'],
      ['L', 'the whole ladder, under Air'],
      ['T', 'try the suggestion; Enter keeps it, Esc puts it back'],
      ['+, −', 'nearer, farther'],
      ['Delete', 'take the hole away'],
      ['[, ]', 'panel to the left, to the right'],
      ['Ctrl Z, Ctrl Shift Z', 'undo, redo'],
      ['F6', 'move between strip, left zone, columns, table'],
    ],
  },
];

interface KeyListProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
}

export function KeyList({ open, onOpenChange }: KeyListProps) {
  const singleKeys = singleKeysPreference.use();
  return (
    <Dialog
      title="Keys"
      width="wide"
      hasClose
      description={
        singleKeys === 'on'
          ? 'Single keys rest while a field is being typed in. They can be turned off in Account. On a Mac, Alt is Option and Ctrl is Command.'
          : 'Single keys are turned off in Account. On a Mac, Alt is Option and Ctrl is Command.'
      }
      open={open}
      onOpenChange={onOpenChange}
    >
      <div className="grid gap-6">
        {GROUPS.map((group) => (
          <section key={group.title}>
            <h3 className="border-hair border-b pb-1 font-semibold">{group.title}</h3>
            <dl className="grid grid-cols-[minmax(7rem,11rem)_1fr]">
              {group.keys.map(([keys, does]) => (
                <div key={does} className="border-hair col-span-2 grid grid-cols-subgrid border-b py-1.5">
                  <dt className="font-semibold">{keys}</dt>
                  <dd className="text-ink2">{does}</dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
    </Dialog>
  );
}
