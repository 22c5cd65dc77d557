import { runInSurroundings } from './lib/measured-surroundings.mjs';

// Standard output carries the figures and nothing else; what the preparations have to say goes to standard error.
await runInSurroundings(['tests', 'bench', 'run-bench.ts'], { nodeFlags: ['--expose-gc'] });
