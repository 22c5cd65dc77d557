import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { inRoot } from './lib/paths.mjs';

const read = (...path) => readFileSync(inRoot(...path), 'utf8');

const copyWords = (line) => line.split(/\s+/).slice(1, -1);

describe('the files for running on a server', () => {
  const copies = read('docker', 'Dockerfile')
    .split('\n')
    .filter((line) => line.startsWith('COPY '));

  it('copies only what is there', () => {
    const sources = copies.filter((line) => !line.includes('--from=')).flatMap(copyWords);
    expect(sources.length).toBeGreaterThan(5);
    expect(sources.filter((source) => !existsSync(inRoot(source)))).toEqual([]);
  });

  it('takes the built pages from where the build puts them', () => {
    expect(read('vite.config.ts')).toContain("outDir: here('./var/client')");
    expect(copies.some((line) => line.includes('/app/var/client pages'))).toBe(true);
  });

  it('starts the server at its entry', () => {
    const command = JSON.parse(/^CMD (\[.*\])$/m.exec(read('docker', 'Dockerfile'))[1]);
    expect(existsSync(inRoot(command.at(-1)))).toBe(true);
  });

  it.each(['compose.yaml', 'compose.https.yaml'])(
    '%s asks only for settings that example.env explains',
    (file) => {
      const explained = [...read('docker', 'example.env').matchAll(/^([A-Z_]+)=/gm)].map(([, name]) => name);
      const asked = [...read('docker', file).matchAll(/\$\{([A-Z_]+)/g)].map(([, name]) => name);
      expect(asked.filter((name) => !explained.includes(name))).toEqual([]);
    },
  );

  it('names in compose only settings that the server reads', () => {
    const settings = [
      ...read('docker', 'compose.yaml').matchAll(/^ {6}((?:BOREWRIGHT|SESSION|DATABASE)_[A-Z_]+):/gm),
    ];
    const config = read('server', 'src', 'config.ts');
    expect(settings.length).toBeGreaterThan(3);
    expect(settings.map(([, name]) => name).filter((name) => !config.includes(name))).toEqual([]);
  });

  it('keeps filled-in secrets out of git and out of the image', () => {
    expect(read('.gitignore').split('\n')).toContain('.env');
    expect(read('.dockerignore').split('\n')).toContain('docker/.env');
  });
});
