import { inflateSync } from 'node:zlib';

const WOFF_SIGNATURE = 0x774f4646;
const WOFF_HEADER_BYTES = 44;
const WOFF_ENTRY_BYTES = 20;
const SFNT_HEADER_BYTES = 12;
const SFNT_ENTRY_BYTES = 16;

interface FontTable {
  tag: number;
  checksum: number;
  data: Buffer;
}

/**
 * The plain font inside a WOFF file, byte for byte.
 *
 * Embedding reads a font's tables glyph by glyph; from a packed file each reading unpacks the whole table again, which
 * takes most of a sheet's time.
 *
 * @throws RangeError if the bytes are not a WOFF file
 * @source WOFF File Format 1.0, W3C Recommendation of 13 December 2012, sections 3 to 5
 */
export function unpackedFont(woff: Buffer): Buffer {
  if (woff.length < WOFF_HEADER_BYTES || woff.readUInt32BE(0) !== WOFF_SIGNATURE) {
    throw new RangeError('These bytes are not a WOFF font.');
  }
  const tables = readTables(woff);
  const directory = Buffer.alloc(SFNT_HEADER_BYTES + tables.length * SFNT_ENTRY_BYTES);
  writeHeader(directory, woff.readUInt32BE(4), tables.length);
  let offset = directory.length;
  const bodies = tables.map(({ tag, checksum, data }, index) => {
    const at = SFNT_HEADER_BYTES + index * SFNT_ENTRY_BYTES;
    directory.writeUInt32BE(tag, at);
    directory.writeUInt32BE(checksum, at + 4);
    directory.writeUInt32BE(offset, at + 8);
    directory.writeUInt32BE(data.length, at + 12);
    const padded = Buffer.concat([data, Buffer.alloc(-data.length & 3)]);
    offset += padded.length;
    return padded;
  });
  return Buffer.concat([directory, ...bodies]);
}

function readTables(woff: Buffer): FontTable[] {
  const count = woff.readUInt16BE(12);
  return Array.from({ length: count }, (_, index) => {
    const at = WOFF_HEADER_BYTES + index * WOFF_ENTRY_BYTES;
    const [offset, packed, length] = [4, 8, 12].map((field) => woff.readUInt32BE(at + field));
    const bytes = woff.subarray(offset, (offset ?? 0) + (packed ?? 0));
    return {
      tag: woff.readUInt32BE(at),
      checksum: woff.readUInt32BE(at + 16),
      data: packed === length ? bytes : inflateSync(bytes),
    };
  });
}

/** The three search figures are laid down by the font format: powers of two under the count of tables. */
function writeHeader(directory: Buffer, flavour: number, count: number): void {
  const power = Math.floor(Math.log2(count));
  directory.writeUInt32BE(flavour, 0);
  directory.writeUInt16BE(count, 4);
  directory.writeUInt16BE(2 ** power * 16, 6);
  directory.writeUInt16BE(power, 8);
  directory.writeUInt16BE(count * 16 - 2 ** power * 16, 10);
}
