import { inflateSync } from 'node:zlib';

/** Sizes of the headers and of a table's directory entry, bytes (WOFF File Format 1.0, 4 and 5). */
const woff = { signature: 0x774f4646, header: 44, entry: 20 };
const sfnt = { header: 12, entry: 16 };

const aligned = (length: number): number => (length + 3) & ~3;

/**
 * The TrueType file inside a WOFF file (W3C Recommendation "WOFF File Format 1.0", 2012). fontkit
 * reads WOFF by itself, but inflates the outlines again for every glyph.
 */
export function unpackWoff(file: Buffer): Buffer {
  if (file.readUInt32BE(0) !== woff.signature) throw new Error('not a WOFF file');
  const count = file.readUInt16BE(12);
  const entries = Array.from({ length: count }, (_, index) => {
    const at = woff.header + index * woff.entry;
    const [offset, packed] = [file.readUInt32BE(at + 4), file.readUInt32BE(at + 8)];
    const length = file.readUInt32BE(at + 12);
    const bytes = file.subarray(offset, offset + packed);
    const table = packed < length ? inflateSync(bytes) : bytes;
    if (table.length !== length) throw new Error('a damaged WOFF file');
    return { head: file.subarray(at, at + woff.entry), table };
  });
  const start = sfnt.header + count * sfnt.entry;
  const total = entries.reduce((sum, { table }) => sum + aligned(table.length), start);
  const font = Buffer.alloc(total);
  const power = Math.floor(Math.log2(count));
  font.writeUInt32BE(file.readUInt32BE(4), 0);
  font.writeUInt16BE(count, 4);
  font.writeUInt16BE(16 * 2 ** power, 6);
  font.writeUInt16BE(power, 8);
  font.writeUInt16BE(16 * (count - 2 ** power), 10);
  let offset = start;
  for (const [index, { head, table }] of entries.entries()) {
    const at = sfnt.header + index * sfnt.entry;
    head.copy(font, at, 0, 4);
    head.copy(font, at + 4, 16, 20);
    font.writeUInt32BE(offset, at + 8);
    font.writeUInt32BE(table.length, at + 12);
    table.copy(font, offset);
    offset += aligned(table.length);
  }
  return font;
}
