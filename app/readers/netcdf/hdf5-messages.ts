import type { MessagePort } from "node:worker_threads";
import type { Attribute, NetcdfVariable, Range } from "./netcdf-file";

/** What the thread that reads HDF5 is asked. */
export type Hdf5Request =
  | { ask: "open"; bytes: Uint8Array }
  | { ask: "numbers"; name: string; block: readonly Range[] }
  | { ask: "texts"; name: string }
  | { ask: "close" };

export type Hdf5Reply =
  | { reply: "opened"; variables: NetcdfVariable[]; attributes: Map<string, Attribute> }
  | { reply: "numbers"; values: Float64Array }
  | { reply: "texts"; texts: string[] }
  | { reply: "closed" }
  | { reply: "failed" };

/** What a thread is started with. */
export interface Hdf5WorkerData {
  /** One number, raised with each reply: the asking thread sleeps on it. */
  signal: Int32Array<SharedArrayBuffer>;
  port: MessagePort;
}
