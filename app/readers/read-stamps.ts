import type { LocalTime, Zone } from "./local-time";
import type { ProblemList } from "./problem-list";
import type { ReadingAnswers, ReadingQuestion, Understood } from "./reading";
import { columnsOfPlan, type StampPlan } from "./stamp-columns";
import { stampReader } from "./stamp-rows";
import { chooseZone } from "./stamp-zone";
import type { FormatKnowledge, TextTable } from "./text-table";

export interface Stamps {
  /** Seconds since 1970-01-01T00:00:00Z, one a row; NaN where unreadable. */
  utc: Float64Array;
  zone: string;
  understood: Understood[];
  questions: ReadingQuestion[];
  /** Rows whose stamp is an error. */
  bad: Set<number>;
}

/** Stamps as written, one a row, in seconds: a million of them as objects would take most of the memory. */
interface WrittenStamps {
  /** On the clock of the file; NaN where unreadable. */
  clock: Float64Array;
  /** East of Greenwich; NaN where the stamp states none. */
  offset: Float64Array;
}

/**
 * Reads all stamps of a table and turns them to UTC. Unreadable stamps, times that a clock never showed and times that
 * it showed twice (where the order of rows does not settle it) are problems with their line, never guessed.
 */
export function readStamps(
  table: TextTable,
  plan: StampPlan,
  knowledge: FormatKnowledge,
  answers: ReadingAnswers,
  problems: ProblemList,
): Stamps {
  const understood: Understood[] = [];
  const questions: ReadingQuestion[] = [];
  const readRow = stampReader(table, plan, answers, understood, questions);
  const count = table.rows.length;
  const written: WrittenStamps = {
    clock: new Float64Array(count).fill(NaN),
    offset: new Float64Array(count).fill(NaN),
  };
  const bad = new Set<number>();
  const names = columnsOfPlan(plan).map((column) => table.names[column] ?? "");
  const column = names.length === 1 ? names[0] : undefined;
  let withOffset = 0;
  let readable = 0;
  for (let row = 0; row < count; row += 1) {
    const stamp = readRow(row);
    if (stamp !== null) {
      written.clock[row] = stamp.clock;
      readable += 1;
      if (stamp.offset === null) continue;
      written.offset[row] = stamp.offset;
      withOffset += 1;
      continue;
    }
    bad.add(row);
    const cells = columnsOfPlan(plan).map((index) => (table.rows.cell(row, index) ?? "").trim());
    const shown = cells.join(" ").trim().slice(0, 40);
    problems.add(
      "error",
      "unreadableTime",
      shown === "" ? "the time is blank" : `“${shown}” is no date and time`,
      "Correct it in the file, or leave the lines out.",
      { row: table.lines[row] ?? 0, column },
    );
  }
  const choice = chooseZone({
    answers,
    byFormat: knowledge.zone,
    offsetsStated: readable > 0 && withOffset === readable,
    columnNames: names,
    preamble: table.preamble,
    problems,
  });
  understood.push(choice.understood);
  if (choice.question !== null) questions.push(choice.question);
  const utc = toUtc(written, choice.zone, table.lines, bad, problems);
  return { utc, zone: choice.zone.name, understood, questions, bad };
}

function toUtc(
  written: WrittenStamps,
  zone: Zone,
  lines: number[],
  bad: Set<number>,
  problems: ProblemList,
): Float64Array {
  const utc = new Float64Array(written.clock.length).fill(NaN);
  const twice: number[] = [];
  const local: (LocalTime | null)[] = [];
  for (let row = 0; row < utc.length; row += 1) {
    const clock = written.clock[row] ?? NaN;
    const offset = written.offset[row] ?? NaN;
    if (Number.isNaN(clock)) continue;
    if (!Number.isNaN(offset)) {
      utc[row] = clock - offset;
      continue;
    }
    const time = zone.toUtc(clock);
    if (time.kind === "one") utc[row] = time.utc;
    else if (time.kind === "twice") {
      twice.push(row);
      local[row] = time;
    } else {
      bad.add(row);
      problems.add(
        "error",
        "missingHour",
        `the clock in ${zone.name} never showed this time: summer time began`,
        "If the clock stayed on standard time, answer the time zone with a fixed offset; else correct or leave out the lines.",
        { row: lines[row] ?? 0 },
      );
    }
  }
  for (const block of blocksOf(twice)) settleTwice(block, written, local, utc, zone, lines, bad, problems);
  return utc;
}

/** Runs of neighbouring rows. */
function blocksOf(rows: number[]): number[][] {
  const blocks: number[][] = [];
  for (const row of rows) {
    const last = blocks.at(-1);
    if (last !== undefined && last.at(-1) === row - 1) last.push(row);
    else blocks.push([row]);
  }
  return blocks;
}

/** Where the clock steps back once within the run, both passes of the hour are there and the order of rows tells them apart. */
function settleTwice(
  block: number[],
  written: WrittenStamps,
  local: (LocalTime | null)[],
  utc: Float64Array,
  zone: Zone,
  lines: number[],
  bad: Set<number>,
  problems: ProblemList,
): void {
  const clocks = block.map((row) => written.clock[row] ?? NaN);
  const descending = (written.clock[(block[0] ?? 0) - 1] ?? NaN) > (clocks[0] ?? 0);
  const steps = clocks.slice(1).map((clock, index) => (clock - (clocks[index] ?? 0)) * (descending ? -1 : 1));
  const backSteps = steps.filter((step) => step <= 0).length;
  const turn = steps.findIndex((step) => step <= 0) + 1;
  for (const [index, row] of block.entries()) {
    const time = local[row];
    if (time?.kind !== "twice") continue;
    const where = { row: lines[row] ?? 0 };
    if (backSteps === 1) {
      const firstPass = descending ? index >= turn : index < turn;
      utc[row] = firstPass ? time.utc : time.later;
      problems.add(
        "warning",
        "repeatedHour",
        `the clock in ${zone.name} showed this hour twice: summer time ended; the order of the lines tells the first pass from the second`,
        "Check these lines.",
        where,
      );
      continue;
    }
    bad.add(row);
    problems.add(
      "error",
      "repeatedHour",
      `the clock in ${zone.name} showed this time twice: summer time ended, and nothing in the file says which is meant`,
      "If the clock stayed on standard time, answer the time zone with a fixed offset; else leave out the lines.",
      where,
    );
  }
}
