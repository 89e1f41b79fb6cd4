import { deflateSync, inflateSync } from "node:zlib";
import { describe, expect, it } from "vitest";
import { codePointsOf, unpackWoff } from "./sfnt";

/** A font of one table `cmap`, packed or as it is. */
function woff(table: Uint8Array, packed: boolean): Uint8Array {
  const data = packed ? new Uint8Array(deflateSync(table)) : table;
  const bytes = new Uint8Array(64 + data.length);
  const view = new DataView(bytes.buffer);
  view.setUint32(0, 0x774f4646);
  view.setUint32(4, 0x00010000);
  view.setUint16(12, 1);
  [0x636d6170, 64, data.length, table.length, 0].forEach((value, index) => view.setUint32(44 + 4 * index, value));
  bytes.set(data, 64);
  return bytes;
}

/** Words of 16 bits as bytes. */
const words = (...values: number[]) => new Uint8Array(values.flatMap((value) => [(value >> 8) & 255, value & 255]));

/** Format 4: A…C by delta, U+03C4 by the glyph array, U+03C5 there mapped to no glyph, and the closing segment. */
const FORMAT_4 = words(
  ...[0, 1, 3, 1, 0, 12],
  ...[4, 44, 0, 6, 4, 1, 2],
  ...[0x43, 0x3c5, 0xffff, 0],
  ...[0x41, 0x3c4, 0xffff],
  ...[-0x40, 0, 1],
  ...[0, 4, 0],
  ...[9, 0],
);

/** Format 12: U+1D6FC…U+1D6FD, and padding that makes it worth packing. */
const FORMAT_12 = words(
  ...[0, 1, 3, 10, 0, 12],
  ...[12, 0, 0, 28, 0, 0, 0, 1],
  ...[1, 0xd6fc, 1, 0xd6fd, 0, 5],
  ...Array<number>(60).fill(0),
);

describe("codePointsOf", () => {
  it("reads segments by delta and by glyph array, and leaves out what maps to no glyph", () => {
    const points = codePointsOf(unpackWoff(woff(FORMAT_4, false), inflateSync));
    expect([...points].sort((a, b) => a - b)).toEqual([0x41, 0x42, 0x43, 0x3c4]);
  });

  it("reads groups beyond the basic plane from a packed table", () => {
    expect([...codePointsOf(unpackWoff(woff(FORMAT_12, true), inflateSync))]).toEqual([0x1d6fc, 0x1d6fd]);
  });

  it("says so where there is nothing to read", () => {
    expect(() => unpackWoff(new Uint8Array(3), inflateSync)).toThrow(RangeError);
    expect(() => unpackWoff(new Uint8Array(60), inflateSync)).toThrow("no WOFF");
    expect(() => codePointsOf(new Uint8Array(12))).toThrow("no cmap");
  });
});
