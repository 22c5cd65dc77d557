// Plain JavaScript: on Node 20 a thread does not inherit the loader of TypeScript and has to ask for it itself.
import { register } from 'tsx/esm/api';

register();
const { designSensitivities } = await import('#shared/analysis/design-sensitivities.ts');

/** What a thread beside the server does: the part of the engine that may take seconds. */
export function sensitivities(document) {
  return designSensitivities(document);
}
