import { MEASUREMENT_LIMITS } from '#shared/measured-bore/measurement-table.ts';

export type TableFileReading = { status: 'read'; text: string } | { status: 'refused'; message: string };

/** A spreadsheet's own file is a packed archive. */
const PACKED = [0x50, 0x4b];
const UTF16 = [
  { mark: [0xff, 0xfe], encoding: 'utf-16le' },
  { mark: [0xfe, 0xff], encoding: 'utf-16be' },
];

/** The text of a table that was saved as CSV, TSV or plain text, in whichever letters the spreadsheet wrote it. */
export async function readTableFile(file: File): Promise<TableFileReading> {
  const { bytes: most } = MEASUREMENT_LIMITS;
  if (file.size > most) {
    return refuse(
      `${file.name} has ${inKilobytes(file.size)} kB; a table of measurements has ${inKilobytes(most)} kB at most. Nothing was changed. Choose the table alone.`,
    );
  }
  const bytes = new Uint8Array(await file.arrayBuffer());
  if (bytes.length === 0) return refuse(`${file.name} is empty. Nothing was changed. Choose another file.`);
  if (beginsWith(bytes, PACKED)) {
    return refuse(
      `${file.name} is a spreadsheet's own file. Nothing was changed. Save the sheet as CSV and choose that, or copy the cells and paste them.`,
    );
  }
  const text = decode(bytes);
  if (text.includes('\u0000'))
    return refuse(`${file.name} is no table of text. Nothing was changed. Choose a CSV, TSV or text file.`);
  return { status: 'read', text };
}

const refuse = (message: string): TableFileReading => ({ status: 'refused', message });

const inKilobytes = (bytes: number) => Math.round(bytes / 1000);

const beginsWith = (bytes: Uint8Array, start: readonly number[]) =>
  start.every((byte, index) => bytes[index] === byte);

function decode(bytes: Uint8Array): string {
  const wide = UTF16.find(({ mark }) => beginsWith(bytes, mark));
  if (wide !== undefined) return new TextDecoder(wide.encoding).decode(bytes);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch (error) {
    if (!(error instanceof TypeError)) throw error;
    // Older spreadsheets write one byte a letter; the figures are the same in all of these.
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
