import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { inRoot } from './lib/paths.mjs';

const read = (...path) => readFileSync(inRoot(...path), 'utf8');

describe.each(['README.md', 'DEVELOPERS.md'])('%s', (file) => {
  const text = read(file);

  it('names only commands that there are', () => {
    const { scripts } = JSON.parse(read('package.json'));
    const named = [...text.matchAll(/npm (?:run )?(?:--silent )?(start|test|[a-z]+)(?= |`|\n|$)/gm)].map(
      ([, name]) => name,
    );
    const ours = named.filter((name) => !['ci', 'run'].includes(name));
    expect(ours.length).toBeGreaterThan(3);
    expect(ours.filter((name) => !(name in scripts))).toEqual([]);
  });

  it('names only files of the repository that are there', () => {
    const named =
      text.match(
        /\b(?:seed-data|docker|server|client|shared|tests)\/[\w./-]+\.(?:ts|tsx|mjs|json|yaml|env|png|md)\b/g,
      ) ?? [];
    const missing = named.filter((path) => path !== 'docker/.env' && !existsSync(inRoot(path)));
    expect(missing).toEqual([]);
  });
});

describe('README.md', () => {
  const text = read('README.md');
  const demo = JSON.parse(read('seed-data', 'workshop.json'));

  it('has the password of the demo workshop', () => {
    expect(text).toContain(`\`${demo.password}\``);
  });

  it('names somebody in every role of the demo workshop', () => {
    const told = [...text.matchAll(/^\| (\S+@\S+) +\| (\w+) +\|$/gm)].map(([, email, role]) => ({
      email,
      role,
    }));
    expect(new Set(told.map(({ role }) => role))).toEqual(new Set(demo.people.map(({ role }) => role)));
    for (const { email, role } of told)
      expect(demo.people).toContainEqual(expect.objectContaining({ email, role }));
  });
});
