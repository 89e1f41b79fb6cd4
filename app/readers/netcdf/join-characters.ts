/**
 * Joins characters along the last dimension: `name(station, 12)` → one text a station.
 * @param codes bytes of UTF-8, row by row
 */
export function joinCharacters(codes: ArrayLike<number>, shape: readonly number[]): string[] {
  const length = shape.at(-1) ?? 1;
  const texts: string[] = [];
  const decoder = new TextDecoder();
  for (let start = 0; start < codes.length && length > 0; start += length) {
    const bytes = Uint8Array.from({ length }, (_, index) => codes[start + index] ?? 0);
    const end = bytes.indexOf(0);
    texts.push(decoder.decode(end < 0 ? bytes : bytes.subarray(0, end)).trim());
  }
  return texts;
}
