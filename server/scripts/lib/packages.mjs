import { existsSync, readFileSync } from 'node:fs';
import { inRoot } from './paths.mjs';
import { findProgram, run } from './processes.mjs';
import { Refusal } from './refusal.mjs';

const readPackages = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;

/** npm notes in node_modules what it installed; it writes that note last, so half an install has none. */
function arePackagesCurrent() {
  const note = inRoot('node_modules', '.package-lock.json');
  if (!existsSync(note)) return false;
  const installed = readPackages(note);
  const wanted = readPackages(inRoot('package-lock.json'));
  const isThere = ([path, entry]) =>
    path === '' || (installed[path] ? installed[path].version === entry.version : entry.optional === true);
  return Object.entries(wanted).every(isThere);
}

/** Installs what the lock file names, if that differs from what stands in node_modules. */
export async function ensurePackages() {
  if (arePackagesCurrent()) return;
  process.stderr.write('Installing the packages of package-lock.json …\n');
  // The npm that started us, if one did; building the pages needs the development packages too.
  const npm = process.env.npm_execpath ? [process.execPath, process.env.npm_execpath] : [findProgram('npm')];
  const parameters = [...npm.slice(1), 'ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  const { code } = await run(npm[0], parameters, { cwd: inRoot(), output: 'to-stderr' });
  if (code !== 0) throw new Refusal('npm ci failed (see above): mend that, then start again.');
}
