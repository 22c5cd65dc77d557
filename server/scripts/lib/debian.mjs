import { findProgram, run } from './processes.mjs';
import { findMariadb } from './mariadb.mjs';
import { Refusal } from './refusal.mjs';

/** How to become root without asking anybody, or null. */
async function rootPrefix() {
  if (process.getuid() === 0) return [];
  const sudo = findProgram('sudo');
  if (!sudo) return null;
  const { code } = await run(sudo, ['-n', 'true'], { output: 'keep' });
  return code === 0 ? [sudo, '-n'] : null;
}

async function aptGet(prefix, ...parameters) {
  const command = [
    ...prefix,
    'env',
    'DEBIAN_FRONTEND=noninteractive',
    'apt-get',
    '-q',
    '-o',
    'DPkg::Lock::Timeout=300',
    ...parameters,
  ];
  const { code, written } = await run(command[0], command.slice(1), { output: 'keep' });
  return { isDone: code === 0, written };
}

async function ensureProgram({ find, name, packages, otherwise = '' }) {
  if (find()) return;
  const byHand = `${name} is missing. Install it with: sudo apt-get install ${packages.join(' ')}${otherwise}`;
  const prefix = findProgram('apt-get') ? await rootPrefix() : null;
  if (!prefix) throw new Refusal(byHand);
  process.stderr.write(`Installing ${packages.join(', ')} from Debian …\n`);
  await aptGet(prefix, 'update');
  const { written } = await aptGet(prefix, 'install', '-y', '--no-install-recommends', ...packages);
  // Judged by what is there afterwards: in a container the package's own service may fail to start, and we need none.
  if (!find()) throw new Refusal(`${written}\n${byHand}`);
}

export function ensureMariadb() {
  return ensureProgram({
    find: () => findMariadb() && findProgram('mariadb-install-db', 'mysql_install_db'),
    name: 'MariaDB',
    packages: ['mariadb-server'],
    otherwise: ' (or set DATABASE_URL to a server you have).',
  });
}

export const findChromium = () => findProgram('chromium', 'chromium-browser', 'google-chrome');

export function ensureChromium() {
  return ensureProgram({ find: findChromium, name: 'Chromium', packages: ['chromium'] });
}
