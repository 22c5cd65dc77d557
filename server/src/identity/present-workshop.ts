import type { Workshop } from '#shared/contract/session.ts';
import type { WorkshopRow } from '../models/workshop.ts';

export function presentWorkshop(row: WorkshopRow): Workshop {
  return {
    id: row.id,
    name: row.name,
    unit: row.unit,
    a4Hz: row.a4Hz,
    temperatureC: row.temperatureC,
    bandCents: [row.band1Cents, row.band2Cents, row.band3Cents],
    referenceEnd: row.referenceEnd,
  };
}
