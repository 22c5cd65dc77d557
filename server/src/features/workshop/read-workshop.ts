import type { Workshop } from '#shared/contract/session.ts';
import type { Dependencies } from '../../dependencies.ts';
import { notFound } from '../../http/http-error.ts';
import type { Caller } from '../../identity/caller.ts';
import { presentWorkshop } from '../../identity/present-workshop.ts';

export async function readWorkshop({ database }: Dependencies, { workshopId }: Caller): Promise<Workshop> {
  const workshop = await database.models.Workshop.findOne({ where: { id: workshopId } });
  if (workshop === null) throw notFound();
  return presentWorkshop(workshop);
}
