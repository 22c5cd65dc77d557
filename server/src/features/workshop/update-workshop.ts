import type { z } from 'zod';
import type { updateWorkshopRequest, Workshop } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import type { Caller } from '../../identity/caller.ts';
import { readWorkshop } from './read-workshop.ts';

type Changes = z.output<typeof updateWorkshopRequest>;

export async function updateWorkshop(
  dependencies: Dependencies,
  caller: Caller,
  changes: Changes,
): Promise<Workshop> {
  await dependencies.database.models.Workshop.update(columns(changes), { where: { id: caller.workshopId } });
  return readWorkshop(dependencies, caller);
}

/** Only what was sent: a column left out stays as it is. */
function columns({ bandCents = [], ...settings }: Changes) {
  const [band1Cents, band2Cents, band3Cents] = bandCents;
  const sent = Object.entries({ ...settings, band1Cents, band2Cents, band3Cents }).filter(
    ([, value]) => value !== undefined,
  );
  return Object.fromEntries(sent);
}
