import { describe, expect, it } from 'vitest';
import { readConfig, StartRefusal } from './config.ts';

const complete = { DATABASE_URL: 'mariadb://a:b@127.0.0.1/c', SESSION_SECRET: 's'.repeat(32) };

describe('readConfig', () => {
  it('listens on this machine alone unless told otherwise', () => {
    expect(readConfig(complete)).toMatchObject({ host: '127.0.0.1', port: 3000, loadDemo: true });
  });

  it.each([
    [{ NODE_ENV: 'production' }, false],
    [{ NODE_ENV: 'production', BOREWRIGHT_DEMO: '1' }, true],
    [{ BOREWRIGHT_DEMO: '0' }, false],
  ])('with %j loads the demo workshop: %s', (environment, loadDemo) => {
    expect(readConfig({ ...complete, ...environment }).loadDemo).toBe(loadDemo);
  });

  it.each([
    [{ DATABASE_URL: 'postgres://a/b' }, 'DATABASE_URL'],
    [{ SESSION_SECRET: 's'.repeat(31) }, 'SESSION_SECRET'],
    [{ PORT: '70000' }, 'PORT'],
    [{ BOREWRIGHT_TRUSTED_PROXIES: 'all' }, 'BOREWRIGHT_TRUSTED_PROXIES'],
  ])('refuses %j by name', (environment, name) => {
    expect(() => readConfig({ ...complete, ...environment })).toThrow(StartRefusal);
    expect(() => readConfig({ ...complete, ...environment })).toThrow(name);
  });
});
