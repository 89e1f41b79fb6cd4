/** Writes small NetCDF files of the classic form (CDF-1), for tests. Layout: NetCDF classic format specification. */

const TYPES = { byte: 1, char: 2, short: 3, int: 4, float: 5, double: 6 } as const;
const WIDTHS = { byte: 1, char: 1, short: 2, int: 4, float: 4, double: 8 } as const;
export type ClassicType = keyof typeof TYPES;

type AttributeValue = string | number | { type: ClassicType; values: number[] };

export interface ClassicVariable {
  name: string;
  type?: ClassicType;
  dimensions: string[];
  values: readonly number[] | string;
  attributes?: Record<string, AttributeValue>;
}

export interface ClassicFile {
  /** Lengths; `null` is the unlimited dimension, whose length is `records`. */
  dimensions: Record<string, number | null>;
  records?: number;
  attributes?: Record<string, AttributeValue>;
  variables: ClassicVariable[];
}

class Bytes {
  readonly list: number[] = [];
  int(value: number): this {
    return this.number("int", value);
  }
  number(type: ClassicType, value: number): this {
    const view = new DataView(new ArrayBuffer(8));
    if (type === "double") view.setFloat64(0, value);
    else if (type === "float") view.setFloat32(0, value);
    else if (type === "int") view.setInt32(0, value);
    else if (type === "short") view.setInt16(0, value);
    else view.setInt8(0, value);
    for (let at = 0; at < WIDTHS[type]; at += 1) this.list.push(view.getUint8(at));
    return this;
  }
  pad(): this {
    while (this.list.length % 4 !== 0) this.list.push(0);
    return this;
  }
  text(text: string): this {
    const bytes = new TextEncoder().encode(text);
    this.int(bytes.length).list.push(...bytes);
    return this.pad();
  }
  attributes(attributes: Record<string, AttributeValue> = {}): this {
    const entries = Object.entries(attributes);
    if (entries.length === 0) return this.int(0).int(0);
    this.int(12).int(entries.length);
    for (const [name, value] of entries) {
      this.text(name);
      if (typeof value === "string") {
        this.int(TYPES.char).text(value);
        continue;
      }
      const { type, values } = typeof value === "number" ? { type: "double" as const, values: [value] } : value;
      this.int(TYPES[type]).int(values.length);
      for (const each of values) this.number(type, each);
      this.pad();
    }
    return this;
  }
}

const isRecord = (file: ClassicFile, variable: ClassicVariable) =>
  file.dimensions[variable.dimensions[0] ?? ""] === null;

function perRecord(file: ClassicFile, { dimensions, type = "float" }: ClassicVariable): number {
  const lengths = dimensions.map((name) => file.dimensions[name]).filter((length) => length !== null);
  return lengths.reduce((size: number, length) => size * (length ?? 1), 1) * WIDTHS[type];
}

const padded = (bytes: number) => Math.ceil(bytes / 4) * 4;

/** The file's bytes. Values are in the order of the dimensions, the last one fastest. */
export function makeNetcdf(file: ClassicFile): Uint8Array {
  const names = Object.keys(file.dimensions);
  const recordVariables = file.variables.filter((variable) => isRecord(file, variable));
  const lone = recordVariables.length === 1;
  const header = (offsets: number[]): Bytes => {
    const bytes = new Bytes();
    bytes.list.push(0x43, 0x44, 0x46, 1);
    bytes
      .int(file.records ?? 0)
      .int(10)
      .int(names.length);
    for (const name of names) bytes.text(name).int(file.dimensions[name] ?? 0);
    bytes.attributes(file.attributes).int(11).int(file.variables.length);
    for (const [index, variable] of file.variables.entries()) {
      bytes.text(variable.name).int(variable.dimensions.length);
      for (const name of variable.dimensions) bytes.int(names.indexOf(name));
      bytes.attributes(variable.attributes).int(TYPES[variable.type ?? "float"]);
      bytes.int(padded(perRecord(file, variable))).int(offsets[index] ?? 0);
    }
    return bytes;
  };
  const bytes = header(file.variables.map(() => 0));
  const offsets: number[] = [];
  let at = bytes.list.length;
  const ordered = [...file.variables.filter((variable) => !recordVariables.includes(variable)), ...recordVariables];
  for (const variable of ordered) {
    offsets[file.variables.indexOf(variable)] = at;
    at += lone && recordVariables.includes(variable) ? perRecord(file, variable) : padded(perRecord(file, variable));
  }
  const whole = header(offsets);
  const write = (variable: ClassicVariable, start: number, count: number): void => {
    const { type = "float", values } = variable;
    const numbers = typeof values === "string" ? [...new TextEncoder().encode(values)] : values;
    for (let index = start; index < start + count; index += 1) whole.number(type, numbers[index] ?? 0);
  };
  const count = (variable: ClassicVariable) => perRecord(file, variable) / WIDTHS[variable.type ?? "float"];
  for (const variable of ordered.filter((each) => !recordVariables.includes(each))) {
    write(variable, 0, count(variable));
    whole.pad();
  }
  for (let record = 0; record < (file.records ?? 0); record += 1) {
    for (const variable of recordVariables) {
      write(variable, record * count(variable), count(variable));
      if (!lone) whole.pad();
    }
  }
  return Uint8Array.from(whole.list);
}

/** Hours `0 … count − 1` of 1 March 2024 as the coordinate `time`, with other attributes where given. */
export function hours(count: number, attributes: Record<string, AttributeValue> = {}): ClassicVariable {
  return {
    name: "time",
    type: "double",
    dimensions: ["time"],
    values: Array.from({ length: count }, (_, hour) => hour),
    attributes: { standard_name: "time", units: "hours since 2024-03-01 00:00:00", ...attributes },
  };
}
