import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { CLIENT_BUILD, VAR, inRoot, inVar } from './paths.mjs';
import { run } from './processes.mjs';
import { Refusal } from './refusal.mjs';

const SOURCES = [
  'client',
  'shared',
  'package-lock.json',
  'tailwind.config.ts',
  'tsconfig.json',
  'vite.config.ts',
];
const STAMP = inVar('client.stamp');

function filesBelow(path) {
  const entries = readdirSync(inRoot(path), { withFileTypes: true });
  return entries.flatMap((entry) =>
    entry.isDirectory() ? filesBelow(join(path, entry.name)) : [join(path, entry.name)],
  );
}

function hashSources() {
  const folders = SOURCES.slice(0, 2);
  const files = [...folders.flatMap(filesBelow), ...SOURCES.slice(2)].filter(
    (file) => !file.includes('.test.'),
  );
  const hash = createHash('sha256');
  for (const file of files.sort())
    hash
      .update(`${file}\0`)
      .update(readFileSync(inRoot(file)))
      .update('\0');
  return hash.digest('hex');
}

/** Builds the pages into var/client, unless what stands there comes from the same sources. */
export async function ensureClientBuilt() {
  const hash = hashSources();
  const isBuilt = existsSync(join(CLIENT_BUILD, 'index.html')) && existsSync(STAMP);
  if (isBuilt && readFileSync(STAMP, 'utf8') === hash) return CLIENT_BUILD;
  process.stderr.write('Building the pages …\n');
  mkdirSync(VAR, { recursive: true });
  rmSync(STAMP, { force: true });
  const vite = inRoot('node_modules', 'vite', 'bin', 'vite.js');
  const { code, written } = await run(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: inRoot(),
    env: { ...process.env, NODE_ENV: 'production' },
    output: 'keep',
  });
  if (code !== 0) throw new Refusal(`${written}\nThe pages could not be built (see above).`);
  writeFileSync(STAMP, hash);
  return CLIENT_BUILD;
}
