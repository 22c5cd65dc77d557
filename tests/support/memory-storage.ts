/** A browser storage in memory, with room for so many characters. */
export class MemoryStorage implements Storage {
  private readonly entries = new Map<string, string>();

  constructor(private readonly room = Infinity) {}

  get length(): number {
    return this.entries.size;
  }

  key(index: number): string | null {
    return [...this.entries.keys()][index] ?? null;
  }

  getItem(key: string): string | null {
    return this.entries.get(key) ?? null;
  }

  setItem(key: string, value: string): void {
    const others = [...this.entries].filter(([other]) => other !== key);
    const used = others.reduce((sum, [, text]) => sum + text.length, 0);
    if (used + value.length > this.room) throw new DOMException('The device is full.', 'QuotaExceededError');
    this.entries.set(key, value);
  }

  removeItem(key: string): void {
    this.entries.delete(key);
  }

  clear(): void {
    this.entries.clear();
  }
}
