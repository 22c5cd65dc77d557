/** Resolves to the folder of the built pages. */
export function ensureClientBuilt(): Promise<string>;
