import { STARTER_KINDS, type StarterKind } from '#shared/document/starter-documents.ts';
import { classNames } from '../../ui/class-names.ts';
import { KIND_NAMES } from './answers.ts';
import { KindSection } from './KindSection.tsx';

interface KindChoiceProps {
  value: StarterKind;
  onChange: (kind: StarterKind) => void;
}

/** What blows it, as a section each: the head says more than the name. */
export function KindChoice({ value, onChange }: KindChoiceProps) {
  return (
    <div role="radiogroup" aria-labelledby="new-design-kind" className="grid gap-2">
      {STARTER_KINDS.map((kind) => (
        <label
          key={kind}
          className={classNames(
            'rounded-control target flex cursor-pointer items-center gap-4 border px-3 py-1.5',
            'has-focus-visible:outline-mark has-focus-visible:outline-3 has-focus-visible:outline-offset-2',
            kind === value ? 'border-mark bg-mark-soft' : 'border-line bg-sheet',
          )}
        >
          <input
            type="radio"
            name="kind"
            value={kind}
            checked={kind === value}
            onChange={() => onChange(kind)}
            className="peer sr-only"
          />
          <KindSection kind={kind} />
          <span className={kind === value ? 'text-mark font-semibold' : undefined}>{KIND_NAMES[kind]}</span>
        </label>
      ))}
    </div>
  );
}
