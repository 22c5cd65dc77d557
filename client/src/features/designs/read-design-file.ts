import type { DesignDocument } from '#shared/document/design-document.ts';
import { readDocument } from '#shared/document/read-document.ts';

export interface FileComplaint {
  /** "holes, 3, diameterMm"; empty when it is about the whole file. */
  place: string;
  message: string;
}

export type DesignFileReading =
  { status: 'read'; document: DesignDocument } | { status: 'refused'; complaints: FileComplaint[] };

/** Far above the largest document; a film chosen by mistake must not be read to its end. */
const MOST_BYTES = 2_000_000;

export async function readDesignFile(file: File): Promise<DesignFileReading> {
  if (file.size > MOST_BYTES)
    return refuse('This file is larger than any design document. Choose another one.');
  let json: unknown;
  try {
    json = JSON.parse(await file.text());
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    return refuse(
      'This is not a design document: it cannot be read as JSON. Choose the file that was saved from a design.',
    );
  }
  const reading = readDocument(json);
  if (reading.status === 'read') return reading;
  return {
    status: 'refused',
    complaints: reading.faults.map(({ path, message }) => ({ place: placeInWords(path), message })),
  };
}

function refuse(message: string): DesignFileReading {
  return { status: 'refused', complaints: [{ place: '', message }] };
}

/** People count from one: `holes.2.diameterMm` is the third hole's. */
function placeInWords(path: readonly (string | number)[]): string {
  return path.map((key) => (typeof key === 'number' ? String(key + 1) : key)).join(' › ');
}
