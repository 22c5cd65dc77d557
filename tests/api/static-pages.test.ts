import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { expectProblem } from '../support/expect-problem.ts';
import { anonymous } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const folder = mkdtempSync(join(tmpdir(), 'borewright-pages-'));
afterAll(() => rmSync(folder, { recursive: true }));
mkdirSync(join(folder, 'assets'));
writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Borewright</title>');
writeFileSync(join(folder, 'mark.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
writeFileSync(join(folder, 'assets', 'main-abc123.js'), 'export {};');

const server = await startTestServer({ staticDir: folder });
const agent = anonymous(server);

describe('the built pages', () => {
  it.each(['/', '/designs', '/designs/7/r/1/holes'])(
    'answer at %s with the one page, asked for anew each time',
    async (path) => {
      const answer = await agent.get(path).expect(200);
      expect(answer.text).toContain('<title>Borewright</title>');
      expect(answer.headers['cache-control']).toBe('no-cache');
    },
  );

  it('let a file that is named after its content be kept for good', async () => {
    const answer = await agent.get('/assets/main-abc123.js').expect(200);
    expect(answer.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect((await agent.get('/mark.svg').expect(200)).headers['cache-control']).toBe('no-cache');
  });

  it('do not pass the page off as a script that is gone', async () => {
    await agent.get('/assets/main-old.js').expect(404);
  });

  it.each(['/../package.json', '/%2e%2e/package.json', '/assets/..%2f..%2fpackage.json'])(
    'keep inside their folder: %s',
    async (path) => {
      expect((await agent.get(path)).text).not.toContain('"dependencies"');
    },
  );

  it('are missed quietly where they are not built', async () => {
    const bare = anonymous(await startTestServer({ staticDir: join(folder, 'nowhere') }));
    expectProblem(await bare.get('/designs'), 404, 'not-found');
  });

  it('load nothing from elsewhere and stand in no frame', async () => {
    const policy = (await agent.get('/')).headers['content-security-policy'] ?? '';
    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toMatch(/https?:/);
  });
});
