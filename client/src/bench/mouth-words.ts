import type { MouthEndKind } from '#shared/document/design-document.ts';

/** What a mouth end is called on the bench; "toward the window". */
export const MOUTH_WORDS: Record<MouthEndKind, string> = {
  window: 'window',
  embouchure: 'embouchure hole',
  rim: 'rim',
  reed: 'reed',
  'ideal-open': 'open end',
  'ideal-closed': 'closed end',
};
