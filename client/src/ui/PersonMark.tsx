/** A person's initials on a disc; the name always stands or is spoken beside it. */
export function PersonMark({ name, size = 30 }: { name: string; size?: number }) {
  return (
    <span
      aria-hidden="true"
      style={{ width: size, height: size }}
      className="rounded-disc bg-ink text-small text-paper inline-flex shrink-0 items-center justify-center font-semibold tracking-[0.02em]"
    >
      {initialsOf(name)}
    </span>
  );
}

function initialsOf(name: string): string {
  const words = name.split(/\s+/).filter((word) => word !== '');
  const [first = '', last = ''] = [words[0], words.length > 1 ? words.at(-1) : ''];
  return firstLetter(first) + firstLetter(last);
}

/** A letter may be more than one unit of a string. */
function firstLetter(word: string): string {
  const code = word.codePointAt(0);
  return code === undefined ? '' : String.fromCodePoint(code);
}
