import { isWorkbenchPanel, type WorkbenchPanel } from '../paths.ts';
import { keepOnDevice, readFromDevice } from './device-store.ts';

const KEY = 'panel';

/** The panel this person last worked in; a design opens there again. */
export function lastPanel(): WorkbenchPanel {
  const kept = readFromDevice(KEY);
  return isWorkbenchPanel(kept) ? kept : 'holes';
}

export function keepLastPanel(panel: WorkbenchPanel): void {
  keepOnDevice(KEY, panel);
}
