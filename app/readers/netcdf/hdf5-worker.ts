/**
 * Runs in a thread of its own: the HDF5 library, compiled to WebAssembly, on one file of unknown origin. The library
 * aborts, loops or grows without bound on some damaged files; here that ends the thread and nothing else.
 */
import { workerData } from "node:worker_threads";
import h5wasm, { type Dataset, type File, type Metadata } from "h5wasm";
import type { Hdf5Reply, Hdf5Request, Hdf5WorkerData } from "./hdf5-messages";
import { joinCharacters } from "./join-characters";
import type { Attribute, NetcdfVariable } from "./netcdf-file";

/** Most memory that the library may take, bytes: what is read of a file of the size limit fits in many times. */
const MOST_MEMORY = 768 * 1024 * 1024;
/** Attributes beyond are not read: no rule needs them. */
const MOST_ATTRIBUTE_VALUES = 10_000;
const MOST_VARIABLES = 2000;
const PAGE = 65_536;
/** In the library's own file system, which lies in memory: it has no way to the machine's. */
const PLACE = "/file";
/** Attributes that keep the form of NetCDF itself. */
const HOUSEKEEPING = new Set([
  "DIMENSION_LIST",
  "REFERENCE_LIST",
  "CLASS",
  "NAME",
  "_Netcdf4Dimid",
  "_Netcdf4Coordinates",
]);
const INTEGER = 0;
const REAL = 1;
const TEXT = 3;

const grow = WebAssembly.Memory.prototype.grow;
WebAssembly.Memory.prototype.grow = function (this: WebAssembly.Memory, pages: number) {
  if (this.buffer.byteLength + pages * PAGE > MOST_MEMORY) throw new RangeError("The file asks for too much memory.");
  return grow.call(this, pages);
};

const { signal, port }: Hdf5WorkerData = workerData;
const datasets = new Map<string, Dataset>();
let file: File | undefined;

port.on("message", async (request: Hdf5Request) => {
  const reply = await answer(request).catch((): Hdf5Reply => ({ reply: "failed" }));
  port.postMessage(reply);
  Atomics.add(signal, 0, 1);
  Atomics.notify(signal, 0);
});

// However the thread ends, whoever waits for it is woken.
process.on("exit", () => {
  Atomics.add(signal, 0, 1);
  Atomics.notify(signal, 0);
});

async function answer(request: Hdf5Request): Promise<Hdf5Reply> {
  if (request.ask === "open") return open(request.bytes);
  if (request.ask === "close") return close();
  const dataset = datasets.get(request.name);
  if (dataset === undefined) throw new Error("no such variable");
  if (request.ask === "numbers") {
    const block = request.block.map(({ start, count }): [number, number] => [start, start + count]);
    return { reply: "numbers", values: numbersFrom(block.length === 0 ? dataset.value : dataset.slice(block)) };
  }
  return { reply: "texts", texts: textsOf(dataset) };
}

async function open(bytes: Uint8Array): Promise<Hdf5Reply> {
  const { FS } = await h5wasm.ready;
  FS.writeFile(PLACE, bytes);
  file = new h5wasm.File(PLACE, "r");
  const names = file.keys();
  if (names.length > MOST_VARIABLES) throw new Error("too many variables");
  for (const name of names) {
    const entity = file.get(name);
    if (entity instanceof h5wasm.Dataset) datasets.set(name, entity);
  }
  const variables = [...datasets].map(([name, dataset]) => describe(name, dataset));
  return { reply: "opened", variables, attributes: attributesOf(file) };
}

async function close(): Promise<Hdf5Reply> {
  const { FS } = await h5wasm.ready;
  datasets.clear();
  file?.close();
  FS.unlink(PLACE);
  return { reply: "closed" };
}

function describe(name: string, dataset: Dataset): NetcdfVariable {
  const { metadata } = dataset;
  const shape = metadata.shape ?? [];
  return {
    name,
    kind: kindOf(metadata),
    bytes: metadata.type === INTEGER || metadata.type === REAL ? metadata.size : 0,
    dimensions: shape.map((length, axis) => dimensionName(name, dataset, axis, shape.length, length)),
    shape,
    attributes: attributesOf(dataset),
  };
}

function kindOf({ type }: Metadata): NetcdfVariable["kind"] {
  return type === INTEGER ? "integer" : type === REAL ? "real" : type === TEXT ? "text" : "other";
}

/** A dimension has the name of the scale attached to it; a scale is a dimension itself; plain HDF5 has only lengths. */
function dimensionName(name: string, dataset: Dataset, axis: number, rank: number, length: number): string {
  const scale = dataset.get_attached_scales(axis)[0];
  if (scale !== undefined) return scale.replace(/^\//, "");
  return rank === 1 ? name : `dimension of ${length}`;
}

function attributesOf(holder: Dataset | File): Map<string, Attribute> {
  const found = new Map<string, Attribute>();
  for (const [name, attribute] of Object.entries(holder.attrs)) {
    const { metadata } = attribute;
    const plain = metadata.type === INTEGER || metadata.type === REAL || metadata.type === TEXT;
    if (HOUSEKEEPING.has(name) || !plain || metadata.total_size * metadata.size > MOST_ATTRIBUTE_VALUES * 8) continue;
    const { value } = attribute;
    if (metadata.type === TEXT) {
      const text = typeof value === "string" ? value : Array.isArray(value) ? value.join(" ") : "";
      found.set(name, { text: text.replace(/\0+$/, ""), numbers: [], integer: false });
    } else {
      found.set(name, { text: "", numbers: [...numbersFrom(value)], integer: metadata.type === INTEGER });
    }
  }
  return found;
}

type Numbers =
  Int8Array | Uint8Array | Int16Array | Uint16Array | Int32Array | Uint32Array | Float32Array | Float64Array;
const NUMBER_ARRAYS = [
  Int8Array,
  Uint8Array,
  Int16Array,
  Uint16Array,
  Int32Array,
  Uint32Array,
  Float32Array,
  Float64Array,
];

function isNumbers(value: unknown): value is Numbers {
  return NUMBER_ARRAYS.some((kind) => value instanceof kind);
}

function numbersFrom(value: unknown): Float64Array {
  if (typeof value === "number" || typeof value === "bigint") return Float64Array.of(Number(value));
  if (isNumbers(value)) return Float64Array.from(value);
  if (value instanceof BigInt64Array || value instanceof BigUint64Array) return Float64Array.from(value, Number);
  throw new Error("not numbers");
}

function textsOf(dataset: Dataset): string[] {
  const { value, metadata } = dataset;
  const texts = Array.isArray(value) ? value.map(String) : [String(value ?? "")];
  const characters = metadata.size === 1 && !metadata.vlen && (metadata.shape ?? []).length > 0;
  if (!characters) return texts.map((text) => text.trim());
  return joinCharacters(
    texts.map((text) => text.charCodeAt(0) || 0),
    metadata.shape ?? [],
  );
}
