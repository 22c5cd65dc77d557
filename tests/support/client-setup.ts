import type { TestProject } from 'vitest/node';
import { ensureClientBuilt } from '../../server/scripts/lib/client-build.mjs';

export async function setup(project: TestProject) {
  project.provide('clientFolder', await ensureClientBuilt());
}
