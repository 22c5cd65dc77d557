const KEY = 'borewright.window';

/** Names this window, and goes on naming it after a reload. */
export function windowId(): string {
  const fresh = Array.from(crypto.getRandomValues(new Uint32Array(2)), (part) => part.toString(36)).join('');
  try {
    const known = sessionStorage.getItem(KEY);
    if (known !== null) return known;
    sessionStorage.setItem(KEY, fresh);
    return fresh;
  } catch (error) {
    // A browser that keeps nothing for the page: every visit is a window of its own.
    if (error instanceof DOMException) return fresh;
    throw error;
  }
}

/** The device's storage, or null where the browser refuses it. */
export function deviceStorage(): Storage | null {
  try {
    return localStorage;
  } catch (error) {
    if (error instanceof DOMException) return null;
    throw error;
  }
}
