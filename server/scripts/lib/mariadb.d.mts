export interface ThrowAwayDatabase {
  url: string;
  stop: () => Promise<void>;
}

export function startThrowAwayMariadb(): Promise<ThrowAwayDatabase>;
