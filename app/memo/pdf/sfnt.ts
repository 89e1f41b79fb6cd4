/** The few parts of the OpenType format that choosing a font for a character needs (ISO/IEC 14496-22; WOFF 1.0, W3C). */

interface TableRecord {
  tag: string;
  offset: number;
  length: number;
}

const WOFF_SIGNATURE = 0x774f4646;

function tagAt(view: DataView, offset: number): string {
  return String.fromCharCode(...[0, 1, 2, 3].map((index) => view.getUint8(offset + index)));
}

function viewOf(bytes: Uint8Array): DataView {
  return new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
}

/**
 * Unpacks a WOFF 1.0 file to the OpenType font inside it.
 * @param inflate unpacks a zlib stream
 * @throws RangeError where the bytes are no WOFF file
 */
export function unpackWoff(woff: Uint8Array, inflate: (packed: Uint8Array) => Uint8Array): Uint8Array {
  const view = viewOf(woff);
  if (woff.byteLength < 44 || view.getUint32(0) !== WOFF_SIGNATURE)
    throw new RangeError("The font is no WOFF 1.0 file.");
  const count = view.getUint16(12);
  const tables = Array.from({ length: count }, (_, index) => {
    const record = 44 + 20 * index;
    const offset = view.getUint32(record + 4);
    const packedLength = view.getUint32(record + 8);
    const length = view.getUint32(record + 12);
    const packed = woff.subarray(offset, offset + packedLength);
    return {
      tag: view.getUint32(record),
      checksum: view.getUint32(record + 16),
      data: packedLength < length ? inflate(packed) : packed,
    };
  });

  const head = 12 + 16 * count;
  const size = tables.reduce((end, { data }) => end + padded(data.byteLength), head);
  const font = new Uint8Array(size);
  const out = viewOf(font);
  const power = Math.floor(Math.log2(count));
  out.setUint32(0, view.getUint32(4));
  out.setUint16(4, count);
  out.setUint16(6, 16 * 2 ** power);
  out.setUint16(8, power);
  out.setUint16(10, 16 * count - 16 * 2 ** power);
  let offset = head;
  tables.forEach(({ tag, checksum, data }, index) => {
    const record = 12 + 16 * index;
    out.setUint32(record, tag);
    out.setUint32(record + 4, checksum);
    out.setUint32(record + 8, offset);
    out.setUint32(record + 12, data.byteLength);
    font.set(data, offset);
    offset += padded(data.byteLength);
  });
  return font;
}

function padded(length: number): number {
  return Math.ceil(length / 4) * 4;
}

/**
 * Code points that an OpenType font has a glyph for, from its `cmap` subtables of format 4 and 12.
 * @throws RangeError where the font has no such table
 */
export function codePointsOf(font: Uint8Array): ReadonlySet<number> {
  const view = viewOf(font);
  const cmap = tablesOf(view).find(({ tag }) => tag === "cmap");
  if (!cmap) throw new RangeError("The font has no cmap table.");
  const covered = new Set<number>();
  const count = view.getUint16(cmap.offset + 2);
  for (let index = 0; index < count; index++) {
    const subtable = cmap.offset + view.getUint32(cmap.offset + 4 + 8 * index + 4);
    const format = view.getUint16(subtable);
    if (format === 4) addSegments(view, subtable, covered);
    if (format === 12) addGroups(view, subtable, covered);
  }
  return covered;
}

function tablesOf(view: DataView): TableRecord[] {
  return Array.from({ length: view.getUint16(4) }, (_, index) => {
    const record = 12 + 16 * index;
    return { tag: tagAt(view, record), offset: view.getUint32(record + 8), length: view.getUint32(record + 12) };
  });
}

/** Format 4: segments of the basic plane. */
function addSegments(view: DataView, start: number, covered: Set<number>): void {
  const doubled = view.getUint16(start + 6);
  const ends = start + 14;
  const starts = ends + doubled + 2;
  const deltas = starts + doubled;
  const ranges = deltas + doubled;
  for (let at = 0; at < doubled; at += 2) {
    const first = view.getUint16(starts + at);
    const last = view.getUint16(ends + at);
    const delta = view.getUint16(deltas + at);
    const range = view.getUint16(ranges + at);
    for (let code = first; code <= last && code < 0xffff; code++) {
      const mapped = range === 0 ? code : view.getUint16(ranges + at + range + 2 * (code - first));
      if (mapped !== 0 && ((mapped + delta) & 0xffff) !== 0) covered.add(code);
    }
  }
}

/** Format 12: groups of any plane. */
function addGroups(view: DataView, start: number, covered: Set<number>): void {
  const count = view.getUint32(start + 12);
  for (let index = 0; index < count; index++) {
    const group = start + 16 + 12 * index;
    const first = view.getUint32(group);
    const last = view.getUint32(group + 4);
    const glyph = view.getUint32(group + 8);
    for (let code = first; code <= last; code++) if (glyph + code - first !== 0) covered.add(code);
  }
}
