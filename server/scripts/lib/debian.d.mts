export function ensureMariadb(): Promise<void>;
export function ensureChromium(): Promise<void>;
export function findChromium(): string | null;
