import { existsSync } from "node:fs";
import { MessageChannel, receiveMessageOnPort, Worker, type WorkerOptions } from "node:worker_threads";
import type { Hdf5Reply, Hdf5Request, Hdf5WorkerData } from "./hdf5-messages";

/** Longest that one file may take, ms: reading 64 MB takes a few seconds, a damaged file can take for ever. */
const TIME_LIMIT_MS = 20_000;

/** A thread that reads one HDF5 file at a time, and is waited for. */
export interface Hdf5Thread {
  /** Null where no answer came in the file's time, or ever will. */
  ask: (request: Hdf5Request) => Hdf5Reply | null;
  stop: () => void;
}

let spare: Hdf5Thread | undefined;

/** A thread for one file: the one that the last file left in good order, or a new one. */
export function takeThread(): Hdf5Thread {
  const thread = spare ?? startThread();
  spare = undefined;
  return thread;
}

/** Keeps a thread that has answered every question so far, for the next file; its own is closed. */
export function giveBackThread(thread: Hdf5Thread): void {
  if (spare === undefined && thread.ask({ ask: "close" })?.reply === "closed") spare = thread;
  else thread.stop();
}

function startThread(): Hdf5Thread {
  const signal = new Int32Array(new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT));
  const { port1: here, port2: there } = new MessageChannel();
  const workerData: Hdf5WorkerData = { signal, port: there };
  // The library writes its errors to the streams; they say nothing to anyone here.
  const worker = startWorker({ workerData, transferList: [there], stdout: true, stderr: true });
  // A thread that the library brought down leaves its question unanswered, which is seen by its time.
  worker.on("error", () => undefined);
  worker.unref();
  let deadline = 0;
  let answered = 0;
  return {
    ask: (request) => {
      if (request.ask === "open") deadline = performance.now() + TIME_LIMIT_MS;
      here.postMessage(request);
      Atomics.wait(signal, 0, answered, Math.max(0, deadline - performance.now()));
      answered += 1;
      const received: { message: Hdf5Reply } | undefined = receiveMessageOnPort(here);
      return received?.message ?? null;
    },
    stop: () => {
      here.close();
      void worker.terminate();
    },
  };
}

/** The thread's code lies in `worker/` beside or above the bundle that holds this, else as source beside this file. */
function startWorker(options: WorkerOptions): Worker {
  const bundled = ["./worker/", "../worker/", "../../worker/"].map(
    (folder) => new URL(`${folder}hdf5-worker.mjs`, import.meta.url),
  );
  const found = bundled.find((place) => existsSync(place));
  if (found !== undefined) return new Worker(found, options);
  // A thread does not take over the loader of TypeScript that runs the sources.
  const source = JSON.stringify(new URL("./hdf5-worker.ts", import.meta.url).href);
  const code = `import("tsx/esm/api").then(({ tsImport }) => tsImport(${source}, ${source}))`;
  return new Worker(code, { ...options, eval: true });
}
