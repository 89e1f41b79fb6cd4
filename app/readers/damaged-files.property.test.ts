import { existsSync, readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { mutateBytes } from "../../tests/factories/mutate-bytes";
import { readCast } from "./casts/read-cast";
import { readSeries } from "./read-series";
import { UnreadableFile } from "./reading";
import { readShape } from "./shapes/read-shape";
import { readTrack } from "./tracks/read-track";

/** Real files lie outside the repository; the invented one is always there. */
const DATA = "../shared/data";
if (!existsSync(DATA)) process.stdout.write(`Skipped: real files with bytes changed, since ${DATA} is absent.\n`);

/** Damaged copies of each file; a longer campaign sets the number and the first seed. */
const COPIES = Number(process.env.GALEPRINT_DAMAGED_COPIES ?? 8);
const SEED = Number(process.env.GALEPRINT_DAMAGED_SEED ?? 1);
/** Of a longer text the start is taken: what can go wrong does so there as well. */
const LONGEST_TEXT = 40_000;

type Read = (input: { bytes: Uint8Array; fileName: string }) => { problems: readonly { message: string }[] };
const ROOMS: [string, Read][] = [
  ["buoy_txt", readSeries],
  ["csv", readSeries],
  ["ctd", readCast],
  ["besttrack", readTrack],
  ["area", readShape],
  ["hostile", readShape],
];

const readAnySeries: Read = readSeries;
const FILES = [
  { path: "tests/factories/files/invented-storm-buoy.txt", read: readAnySeries },
  ...ROOMS.flatMap(([folder, read]) =>
    existsSync(`${DATA}/${folder}`)
      ? readdirSync(`${DATA}/${folder}`, { withFileTypes: true })
          .filter((entry) => entry.isFile())
          .map(({ name }) => ({ path: `${DATA}/${folder}/${name}`, read }))
      : [],
  ),
];

function expectReadingOrRefusal(read: Read, bytes: Uint8Array, fileName: string): void {
  let problems: readonly { message: string }[];
  try {
    problems = read({ bytes, fileName }).problems;
  } catch (error) {
    if (!(error instanceof UnreadableFile)) throw error;
    problems = error.problems;
    expect(problems.length).toBeGreaterThan(0);
  }
  expect(problems.every(({ message }) => message.length > 10)).toBe(true);
}

describe("damaged files", () => {
  it.each(FILES)("$path ends in a reading or a refusal, whatever is changed, lost or repeated", ({ path, read }) => {
    const good = readFileSync(path).subarray(0, LONGEST_TEXT);
    for (let copy = 0; copy < COPIES; copy += 1) {
      const seed = SEED + copy;
      try {
        expectReadingOrRefusal(read, mutateBytes(good, seed), path);
      } catch (error) {
        throw new Error(`damage by seed ${seed}`, { cause: error });
      }
    }
  });

  it("is the same damage for the same seed", () => {
    const good = Uint8Array.from({ length: 500 }, (_, index) => index % 251);
    expect(mutateBytes(good, 5)).toEqual(mutateBytes(good, 5));
    expect(mutateBytes(good, 5)).not.toEqual(mutateBytes(good, 6));
  });
});
