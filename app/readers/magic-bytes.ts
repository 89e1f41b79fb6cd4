interface Signature {
  bytes: readonly number[];
  what: string;
  toDo: string;
}

const EXPORT_TEXT = "Export the table as text (CSV) and give that file.";

/** First bytes of files that are often renamed to .csv or .txt. Source: the formats' own specifications. */
const SIGNATURES: readonly Signature[] = [
  {
    bytes: [0x89, 0x50, 0x4e, 0x47],
    what: "a PNG image",
    toDo: "Give the file with the numbers, not a picture of it.",
  },
  { bytes: [0xff, 0xd8, 0xff], what: "a JPEG image", toDo: "Give the file with the numbers, not a picture of it." },
  {
    bytes: [0x47, 0x49, 0x46, 0x38],
    what: "a GIF image",
    toDo: "Give the file with the numbers, not a picture of it.",
  },
  {
    bytes: [0x49, 0x49, 0x2a, 0x00],
    what: "a TIFF image",
    toDo: "Give the file with the numbers, not a picture of it.",
  },
  {
    bytes: [0x4d, 0x4d, 0x00, 0x2a],
    what: "a TIFF image",
    toDo: "Give the file with the numbers, not a picture of it.",
  },
  {
    bytes: [0x25, 0x50, 0x44, 0x46, 0x2d],
    what: "a PDF document",
    toDo: "Ask for the table behind the document as text (CSV).",
  },
  { bytes: [0x1f, 0x8b], what: "a gzip archive", toDo: "Unpack it and give the file inside." },
  { bytes: [0x42, 0x5a, 0x68], what: "a bzip2 archive", toDo: "Unpack it and give the file inside." },
  { bytes: [0xfd, 0x37, 0x7a, 0x58, 0x5a], what: "an xz archive", toDo: "Unpack it and give the file inside." },
  { bytes: [0x37, 0x7a, 0xbc, 0xaf], what: "a 7-Zip archive", toDo: "Unpack it and give the file inside." },
  { bytes: [0x52, 0x61, 0x72, 0x21], what: "a RAR archive", toDo: "Unpack it and give the file inside." },
  { bytes: [0x89, 0x48, 0x44, 0x46], what: "an HDF5 or NetCDF-4 file", toDo: EXPORT_TEXT },
  { bytes: [0x43, 0x44, 0x46, 0x01], what: "a NetCDF file", toDo: EXPORT_TEXT },
  { bytes: [0x43, 0x44, 0x46, 0x02], what: "a NetCDF file", toDo: EXPORT_TEXT },
  { bytes: [0x43, 0x44, 0x46, 0x05], what: "a NetCDF file", toDo: EXPORT_TEXT },
  { bytes: [0x47, 0x52, 0x49, 0x42], what: "a GRIB file", toDo: EXPORT_TEXT },
  { bytes: [0x53, 0x51, 0x4c, 0x69, 0x74, 0x65], what: "an SQLite database", toDo: EXPORT_TEXT },
  { bytes: [0x7f, 0x45, 0x4c, 0x46], what: "a program", toDo: "Give a data file." },
  { bytes: [0x4d, 0x5a, 0x90, 0x00], what: "a program", toDo: "Give a data file." },
  {
    bytes: [0x00, 0x00, 0x27, 0x0a],
    what: "a shapefile",
    toDo: "Import it on the Area page, zipped with its .shx, .dbf and .prj.",
  },
];

const ZIP = [0x50, 0x4b];

/**
 * Names a binary file by its first bytes.
 * @returns what it is and what to do, or null where the bytes are of no known binary kind
 */
export function binaryKind(bytes: Uint8Array): { what: string; toDo: string } | null {
  if (startsWith(bytes, ZIP) && (bytes[2] === 3 || bytes[2] === 5 || bytes[2] === 7))
    return { what: "a zip archive", toDo: "Unpack it and give the file inside." };
  const found = SIGNATURES.find((signature) => startsWith(bytes, signature.bytes));
  return found === undefined ? null : { what: found.what, toDo: found.toDo };
}

const HDF5 = [0x89, 0x48, 0x44, 0x46, 0x0d, 0x0a, 0x1a, 0x0a];
const CLASSIC = [0x43, 0x44, 0x46];

/** Whether bytes are a NetCDF file of any kind: classic (`CDF` and a version) or NetCDF-4, which is HDF5. */
export function isNetcdf(bytes: Uint8Array): boolean {
  return startsWith(bytes, HDF5) || (startsWith(bytes, CLASSIC) && [1, 2, 5].includes(bytes[3] ?? 0));
}

const OLE = [0xd0, 0xcf, 0x11, 0xe0];

/** Whether bytes are an Excel workbook: zipped (`.xlsx`) or of the older binary kind (`.xls`). */
export function isWorkbook(bytes: Uint8Array): "zipped" | "binary" | null {
  if (startsWith(bytes, OLE)) return "binary";
  if (!startsWith(bytes, ZIP)) return null;
  // A workbook names its parts near the start of the archive; any other zip does not.
  const head = String.fromCharCode(...bytes.subarray(0, 4096));
  return head.includes("xl/") || head.includes("[Content_Types].xml") ? "zipped" : null;
}

function startsWith(bytes: Uint8Array, signature: readonly number[]): boolean {
  return signature.every((byte, index) => bytes[index] === byte);
}
