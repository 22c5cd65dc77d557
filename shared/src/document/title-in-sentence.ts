/** A title inside a sentence: `Hole L1` is written `hole L1`, and the name stays as it was given. */
export function titleInSentence(title: string): string {
  return title.charAt(0).toLowerCase() + title.slice(1);
}
