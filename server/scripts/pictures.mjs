import { mkdir, rm } from 'node:fs/promises';
import { runInSurroundings } from './lib/measured-surroundings.mjs';
import { inRoot } from './lib/paths.mjs';

// Every screen and state, at three widths, by day and in the evening, for people to look at.
const folder = inRoot('var', 'pictures');
await rm(folder, { recursive: true, force: true });
await mkdir(folder, { recursive: true });
await runInSurroundings(['tests', 'pictures', 'take-pictures.ts'], {
  args: process.argv.slice(2),
  env: { PICTURES_FOLDER: folder },
});
