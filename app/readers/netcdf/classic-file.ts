import { NetCDFReader } from "netcdfjs";
import { joinCharacters } from "./join-characters";
import {
  checkBlock,
  DamagedNetcdf,
  sizeOf,
  wholeOf,
  type Attribute,
  type Attributes,
  type NetcdfFile,
  type NetcdfVariable,
  type Range,
} from "./netcdf-file";

interface Stored extends NetcdfVariable {
  type: string;
  /** Byte at which the values begin. */
  offset: number;
  /** Whether the first dimension is the unlimited one, whose records interleave the variables. */
  record: boolean;
}

const TYPE_BYTES: Readonly<Record<string, number>> = { byte: 1, char: 1, short: 2, int: 4, float: 4, double: 8 };

/** Number of records of a file that was still being written: it has to be told from the file's length. */
const STREAMING = 0xffffffff;

/** Most dimensions of a variable and attributes of a file that are taken seriously. */
const MOST_DIMENSIONS = 64;

/**
 * Opens a NetCDF file of the classic kinds (CDF-1, CDF-2). The package reads the header; values are taken from the bytes
 * here, since it reads whole variables only and takes the padding of short records for values.
 * Layout: NetCDF classic format specification (NUG, appendix B), including the rule that a lone record variable is not padded.
 * @throws DamagedNetcdf where the header cannot be read
 */
export function openClassic(bytes: Uint8Array): NetcdfFile {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const { header } = parseHeader(bytes);
  const dimensions = header.dimensions ?? [];
  const records = header.recordDimension;
  const bare = (header.variables ?? []).map((variable): Stored => {
    const size = TYPE_BYTES[variable.type];
    const known = variable.dimensions.every((id) => dimensions[id] !== undefined);
    if (size === undefined || !known || variable.dimensions.length > MOST_DIMENSIONS) {
      throw new DamagedNetcdf("has a damaged list of variables");
    }
    return {
      name: utf8(variable.name),
      type: variable.type,
      kind:
        variable.type === "char"
          ? "text"
          : variable.type === "float" || variable.type === "double"
            ? "real"
            : "integer",
      bytes: variable.type === "char" ? 0 : size,
      dimensions: variable.dimensions.map((id) => utf8(dimensions[id]?.name ?? "")),
      shape: variable.dimensions.map((id) => dimensions[id]?.size ?? 0),
      attributes: attributesOf(variable.attributes),
      offset: variable.offset,
      record: records.id !== undefined && variable.dimensions[0] === records.id,
    };
  });
  const recordBytes = recordSize(bare);
  const length = records.length === STREAMING ? recordsInFile(bare, recordBytes, bytes.length) : records.length;
  const variables = bare.map((variable) =>
    variable.record ? { ...variable, shape: [length, ...variable.shape.slice(1)] } : variable,
  );
  const byName = new Map(variables.map((variable) => [variable.name, variable]));
  const read = (variable: NetcdfVariable, block: readonly Range[]): Float64Array => {
    const stored = byName.get(variable.name);
    if (stored === undefined) throw new DamagedNetcdf(`has no variable “${variable.name}”`);
    checkBlock(stored, block);
    return readBlock(view, stored, block, recordBytes);
  };
  return {
    label: header.version === 1 ? "NetCDF classic" : "NetCDF classic, 64-bit offset",
    variables,
    attributes: attributesOf(header.globalAttributes),
    numbers: (variable, block = wholeOf(variable)) => read(variable, block),
    texts: (variable) => joinCharacters(read(variable, wholeOf(variable)), variable.shape),
    close: () => undefined,
  };
}

function parseHeader(bytes: Uint8Array): NetCDFReader {
  if (bytes[3] === 5) {
    throw new DamagedNetcdf("is of the 64-bit data kind (CDF-5), which is not read", "Save it as NetCDF-4 or classic.");
  }
  try {
    return new NetCDFReader(bytes);
  } catch {
    throw new DamagedNetcdf("has a damaged header");
  }
}

/** Bytes of one variable in one record, or of all of a variable that has no records. */
function storedBytes({ record, shape, type }: Stored): number {
  return sizeOf(record ? shape.slice(1) : shape) * (TYPE_BYTES[type] ?? 0);
}

function recordSize(variables: readonly Stored[]): number {
  const sizes = variables.filter(({ record }) => record).map(storedBytes);
  if (sizes.length === 1) return sizes[0] ?? 0;
  return sizes.reduce((sum, size) => sum + Math.ceil(size / 4) * 4, 0);
}

function recordsInFile(variables: readonly Stored[], recordBytes: number, fileBytes: number): number {
  const first = Math.min(...variables.filter(({ record }) => record).map(({ offset }) => offset));
  return recordBytes === 0 || !Number.isFinite(first) ? 0 : Math.max(0, Math.floor((fileBytes - first) / recordBytes));
}

type Getter = (at: number) => number;

function getterOf(view: DataView, type: string): Getter {
  switch (type) {
    case "short":
      return (at) => view.getInt16(at);
    case "int":
      return (at) => view.getInt32(at);
    case "float":
      return (at) => view.getFloat32(at);
    case "double":
      return (at) => view.getFloat64(at);
    case "byte":
      return (at) => view.getInt8(at);
    default:
      return (at) => view.getUint8(at);
  }
}

function readBlock(view: DataView, variable: Stored, block: readonly Range[], recordBytes: number): Float64Array {
  const width = TYPE_BYTES[variable.type] ?? 0;
  const strides = stridesOf(variable, width, recordBytes);
  const last = block.reduce((at, { start, count }, axis) => at + (start + count - 1) * (strides[axis] ?? 0), 0);
  const total = sizeOf(block.map(({ count }) => count));
  if (total > 0 && variable.offset + last + width > view.byteLength) {
    throw new DamagedNetcdf(`is cut short: the values of “${variable.name}” go on beyond its end`);
  }
  const values = new Float64Array(total);
  const get = getterOf(view, variable.type);
  const index = block.map(() => 0);
  let at = variable.offset + block.reduce((sum, { start }, axis) => sum + start * (strides[axis] ?? 0), 0);
  for (let position = 0; position < total; position += 1) {
    values[position] = get(at);
    for (let axis = block.length - 1; axis >= 0; axis -= 1) {
      const next = (index[axis] ?? 0) + 1;
      const stride = strides[axis] ?? 0;
      if (next < (block[axis]?.count ?? 0)) {
        index[axis] = next;
        at += stride;
        break;
      }
      index[axis] = 0;
      at -= (next - 1) * stride;
    }
  }
  return values;
}

function stridesOf({ shape, record }: Stored, width: number, recordBytes: number): number[] {
  const strides = shape.map((_, axis) => sizeOf(shape.slice(axis + 1)) * width);
  return record ? [recordBytes, ...strides.slice(1)] : strides;
}

function attributesOf(list: unknown): Attributes {
  const found = new Map<string, Attribute>();
  if (!Array.isArray(list)) return found;
  for (const entry of list) {
    const { name, type, value }: { name?: unknown; type?: unknown; value?: unknown } = entry ?? {};
    if (typeof name !== "string") continue;
    const stored = (Array.isArray(value) ? value : [value]).filter((each) => typeof each === "number");
    // The package gives bytes without their sign.
    const numbers = type === "byte" ? stored.map((each) => (each > 127 ? each - 256 : each)) : stored;
    found.set(utf8(name), {
      text: typeof value === "string" ? utf8(value).replace(/\0+$/, "") : "",
      numbers,
      integer: type === "byte" || type === "short" || type === "int",
    });
  }
  return found;
}

/** The package gives one character a byte, signed; names and texts are UTF-8. */
function utf8(characters: string): string {
  return new TextDecoder().decode(Uint8Array.from(characters, (character) => character.charCodeAt(0) & 0xff));
}
