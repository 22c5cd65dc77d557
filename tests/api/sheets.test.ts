import { describe, expect, it } from 'vitest';
import { buildDesign } from '../support/build-design.ts';
import { buildPerson } from '../support/build-person.ts';
import { expectProblem, pathsOf } from '../support/expect-problem.ts';
import { signInAs } from '../support/sign-in-as.ts';
import { startTestServer } from '../support/start-test-server.ts';

const server = await startTestServer();

async function openSheet(name = 'Wharf D') {
  const maker = await buildPerson(server, { role: 'maker' });
  const id = await buildDesign(server, { by: maker, document: { name } });
  return { agent: await signInAs(server, maker), address: `/api/designs/${id}/draft/sheet.pdf` };
}

/** Widths of the pages in points, as the PDF states them. */
function pageWidths(pdf: Buffer): number[] {
  return [...pdf.toString('latin1').matchAll(/\/MediaBox \[0 0 ([\d.]+) [\d.]+\]/g)].map((match) =>
    Math.round(Number(match[1])),
  );
}

describe('the sheet of a draft', () => {
  // A4 is 210 mm wide (ISO 216), Letter 8.5 in; a point is 1/72 in.
  it.each([
    ['', 595],
    ['?paper=A4&unit=mm', 595],
    ['?paper=Letter&unit=inch', 612],
  ])('is a PDF on the paper asked for: %s', async (query, width) => {
    const { agent, address } = await openSheet();
    const answer = await agent.get(`${address}${query}`).buffer(true).expect(200);
    expect(answer.type).toBe('application/pdf');
    const pdf = answer.body as Buffer;
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(new Set(pageWidths(pdf))).toEqual(new Set([width]));
  });

  it('is saved under the name of the design, whatever it holds', async () => {
    const { agent, address } = await openSheet('Flöte "№ 1"\\; x');
    const answer = await agent.get(address).expect(200);
    expect(answer.headers['content-disposition']).toBe(
      `inline; filename="Fl_te __ 1___ x.pdf"; filename*=UTF-8''Fl%C3%B6te%20%22%E2%84%96%201%22%5C%3B%20x.pdf`,
    );
  });

  it.each([
    ['?paper=A3', 'paper'],
    ['?unit=ell', 'unit'],
    ['?approved=true', 'approved'],
  ])('refuses %s', async (query, path) => {
    const { agent, address } = await openSheet();
    expect(pathsOf(expectProblem(await agent.get(address + query), 400, 'bad-request'))).toEqual([path]);
  });
});
