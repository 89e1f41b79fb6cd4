import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { mulberry32 } from "~/ocean/statistics/mulberry32";
import { report } from "./measure";

const ROWS = 1_000_000;
const ROUNDS = 3;
const READ = fileURLToPath(new URL("./read-million-rows.ts", import.meta.url));

interface Read {
  rows: number;
  nanoseconds: number;
  mebibytes: number;
}

/** A million minutes of invented wind, rain and air temperature as CSV, about 45 MB. */
function millionRows(): string {
  const random = mulberry32(7);
  const lines = [
    "time (UTC),wind speed at 10 m (m/s),wind direction from (deg),rain (mm/h),air temperature at 2 m (degC)",
  ];
  for (let row = 0; row < ROWS; row += 1) {
    const time = new Date(Date.UTC(2024, 0, 1) + row * 60_000).toISOString().slice(0, 19);
    const rain = random() < 0.9 ? 0 : 10 * random();
    const values = [
      (25 * random()).toFixed(2),
      (360 * random()).toFixed(1),
      rain.toFixed(2),
      (30 * random()).toFixed(3),
    ];
    lines.push(`${time}Z,${values.join(",")}`);
  }
  return `${lines.join("\n")}\n`;
}

/** The whole reading of a large file beside its mere parsing; by turns, so that both meet the same machine. */
export function benchReading(): void {
  const folder = mkdtempSync(join(tmpdir(), "galeprint-bench-"));
  try {
    const file = join(folder, "million-rows.csv");
    writeFileSync(file, millionRows());
    const read = (how: "papaparse" | "reader"): Read =>
      JSON.parse(execFileSync(process.execPath, ["--import", "tsx", READ, how, file], { encoding: "utf8" }));
    const rounds = Array.from({ length: ROUNDS }, () => ({ papaparse: read("papaparse"), reader: read("reader") }));
    const reader = Math.min(...rounds.map((round) => round.reader.nanoseconds));
    const papaparse = Math.min(...rounds.map((round) => round.papaparse.nanoseconds));
    const peak = Math.max(...rounds.map((round) => round.reader.mebibytes));
    report("read csv 1000000 rows", rounds[0].reader.rows, "1", 1, ROWS);
    report("read csv 1000000 time", reader / 1e9, "s", ROUNDS);
    report("read csv 1000000 papaparse", papaparse / 1e9, "s", ROUNDS);
    report("read csv 1000000 ratio", reader / papaparse, "1", ROUNDS);
    report("read csv 1000000 rowsPerSecond", ROWS / (reader / 1e9), "1/s", ROUNDS);
    report("read csv 1000000 memory", peak, "MiB", ROUNDS);
  } finally {
    rmSync(folder, { recursive: true });
  }
}
