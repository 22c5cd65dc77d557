import { singleKeysPreference } from '../lib/preferences.ts';

/** True when a bare key is meant as a command: not while something is typed, and not when the person turned them off. */
export function isSingleKey(event: KeyboardEvent, key: string): boolean {
  if (event.key !== key || event.defaultPrevented) return false;
  if (event.ctrlKey || event.metaKey || event.altKey) return false;
  return singleKeysPreference.read() === 'on' && !isTyping(event.target);
}

function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    target.closest(
      'input:not([type="checkbox"], [type="radio"]), textarea, select, [contenteditable="true"]',
    ) !== null
  );
}
