import { describe, expect, it } from 'vitest';
import { readTableFile } from './measured-table-file.ts';

const TABLE = 'Position;Ø\n0;12,7\n';

const utf16 = (text: string) => {
  const codes = new Uint16Array([0xfeff, ...Array.from(text, (letter) => letter.charCodeAt(0))]);
  return new Uint8Array(codes.buffer);
};

describe('readTableFile', () => {
  it.each([
    ['UTF-8', TABLE],
    ['UTF-16, as spreadsheets save Unicode text', utf16(TABLE)],
    ['one byte a letter', Uint8Array.from(TABLE, (letter) => letter.charCodeAt(0))],
  ])('reads %s', async (_, content) => {
    const reading = await readTableFile(new File([content], 'bore.csv'));
    expect(reading).toEqual({ status: 'read', text: TABLE });
  });

  it.each([
    ['a spreadsheet', 'PK\u0003\u0004', /bore\.csv is a spreadsheet's own file.*Save the sheet as CSV/],
    ['a picture', '\u0089PNG\u0000\u0000', /no table of text/],
    ['nothing', '', /is empty/],
    ['a film', new Uint8Array(1_000_001), /has 1000 kB; .* 1000 kB at most/],
  ])('says what %s is', async (_, content, message) => {
    const reading = await readTableFile(new File([content], 'bore.csv'));
    expect(reading.status === 'refused' && reading.message).toMatch(message);
  });
});
