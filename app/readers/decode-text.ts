/** Text of a file with one kind of line end, and how its bytes were taken. */
export interface DecodedText {
  text: string;
  encoding: "UTF-8" | "UTF-16 LE" | "UTF-16 BE" | "Windows-1252";
  byteOrderMark: boolean;
  lineEnds: "LF" | "CRLF" | "CR" | "mixed" | "none";
}

/**
 * Turns bytes into text: by the byte order mark; else UTF-16 where every second byte of the start is NUL; else UTF-8
 * where it is valid; else Windows-1252, a superset of printable Latin-1 in which every byte has a character.
 * Line ends become `\n`.
 * @returns null where the bytes hold NULs that no text has
 */
export function decodeText(bytes: Uint8Array): DecodedText | null {
  const taken = decodeBytes(bytes);
  if (taken === null) return null;
  const { text, lineEnds } = unifyLineEnds(taken.text);
  return { ...taken, text, lineEnds };
}

function decodeBytes(bytes: Uint8Array): Omit<DecodedText, "lineEnds"> | null {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return utf16(bytes.subarray(2), "UTF-16 LE", true);
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return utf16(bytes.subarray(2), "UTF-16 BE", true);
  const marked = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
  const body = marked ? bytes.subarray(3) : bytes;
  const parity = nulParity(body);
  if (parity === "odd") return utf16(body, "UTF-16 LE", false);
  if (parity === "even") return utf16(body, "UTF-16 BE", false);
  if (body.includes(0)) return null;
  try {
    const text = new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(body);
    return { text, encoding: "UTF-8", byteOrderMark: marked };
  } catch {
    return { text: new TextDecoder("windows-1252").decode(body), encoding: "Windows-1252", byteOrderMark: false };
  }
}

function utf16(
  bytes: Uint8Array,
  encoding: "UTF-16 LE" | "UTF-16 BE",
  byteOrderMark: boolean,
): Omit<DecodedText, "lineEnds"> | null {
  const text = new TextDecoder(encoding === "UTF-16 LE" ? "utf-16le" : "utf-16be").decode(bytes);
  return text.includes("\0") ? null : { text, encoding, byteOrderMark };
}

/** Text in Latin script as UTF-16 has a NUL in nearly every second byte; digits and separators always do. */
function nulParity(bytes: Uint8Array): "odd" | "even" | "none" {
  const length = Math.min(bytes.length - (bytes.length % 2), 2000);
  if (length < 4) return "none";
  let even = 0;
  let odd = 0;
  for (let index = 0; index < length; index += 2) {
    if (bytes[index] === 0) even += 1;
    if (bytes[index + 1] === 0) odd += 1;
  }
  const pairs = length / 2;
  if (odd > 0.7 * pairs && even === 0) return "odd";
  if (even > 0.7 * pairs && odd === 0) return "even";
  return "none";
}

function unifyLineEnds(text: string): Pick<DecodedText, "text" | "lineEnds"> {
  const hasReturn = text.includes("\r");
  if (!hasReturn) return { text, lineEnds: text.includes("\n") ? "LF" : "none" };
  const withoutPairs = text.replaceAll("\r\n", "\n");
  const pairs = text.length - withoutPairs.length;
  const loneReturn = withoutPairs.includes("\r");
  const newlines = withoutPairs.includes("\n");
  const unified = loneReturn ? withoutPairs.replaceAll("\r", "\n") : withoutPairs;
  if (pairs > 0 && !loneReturn) return { text: unified, lineEnds: "CRLF" };
  return { text: unified, lineEnds: newlines || pairs > 0 ? "mixed" : "CR" };
}
