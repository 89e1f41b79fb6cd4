import { readFileSync } from "node:fs";
import Papa from "papaparse";
import { readSeries } from "~/readers/read-series";

/**
 * Reads one file in a process of its own, so that its peak of memory is its own: `read-million-rows.ts papaparse|reader FILE`.
 * Prints time and growth over the process that holds neither text nor table yet.
 */
const [how, path] = process.argv.slice(2);
const idle = process.resourceUsage().maxRSS;
const start = process.hrtime.bigint();
const bytes = readFileSync(path);
const rows =
  how === "papaparse"
    ? Papa.parse<string[]>(bytes.toString("utf8"), { header: false, skipEmptyLines: true }).data.length - 1
    : readSeries({ bytes, fileName: path }).rows;
const nanoseconds = Number(process.hrtime.bigint() - start);
const mebibytes = (process.resourceUsage().maxRSS - idle) / 1024;
console.log(JSON.stringify({ rows, nanoseconds, mebibytes }));
