/** What is kept on this device between visits. A browser that refuses storage keeps nothing, and everything still works. */
export function readFromDevice(key: string): string | null {
  try {
    return localStorage.getItem(`borewright.${key}`);
  } catch (error) {
    if (error instanceof DOMException) return null;
    throw error;
  }
}

/** Returns whether it was kept. */
export function keepOnDevice(key: string, value: string): boolean {
  try {
    localStorage.setItem(`borewright.${key}`, value);
    return true;
  } catch (error) {
    if (error instanceof DOMException) return false;
    throw error;
  }
}
