import type { TestServer } from './start-test-server.ts';

export interface BuiltWorkshop {
  id: number;
  name: string;
}

export async function buildWorkshop(
  { database }: TestServer,
  { name = 'Test Yard' }: { name?: string } = {},
): Promise<BuiltWorkshop> {
  const { id } = await database.models.Workshop.create({ name, unit: 'mm', a4Hz: 440, temperatureC: 24 });
  return { id, name };
}
