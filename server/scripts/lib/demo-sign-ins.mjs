import { readFileSync } from 'node:fs';
import { inRoot } from './paths.mjs';

const isDemoWanted = ({ BOREWRIGHT_DEMO, NODE_ENV }) =>
  BOREWRIGHT_DEMO === undefined ? NODE_ENV !== 'production' : BOREWRIGHT_DEMO === '1';

/** Who can sign in to the demo workshop, for the terminal; empty where the server does not load it. */
export function demoSignIns(environment) {
  if (!isDemoWanted(environment)) return '';
  const demo = JSON.parse(readFileSync(inRoot('seed-data', 'workshop.json'), 'utf8'));
  const lines = demo.people.map(({ role, email }) => `  ${role.padEnd(12)}${email}`);
  return `Sign in to the demo workshop with the password ${demo.password} as\n${lines.join('\n')}\n`;
}
