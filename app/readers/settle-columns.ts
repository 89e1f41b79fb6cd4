import { CHANNEL_LIMITS } from "./channel-limits";
import { CHANNEL_QUANTITIES, isPerInterval, unitById, unitsFor, type FileUnit } from "./file-units";
import { SENTINELS } from "./missing-codes";
import { hasHeatSense, isValueRole, statesHeatSense, type ColumnProposal, type ValueRole } from "./propose-columns";
import type { ProblemList } from "./problem-list";
import type { ChannelName, ReadingAnswers, ReadingQuestion, Understood } from "./reading";
import { medianOf, rangeOf, type ColumnScan } from "./scan-column";

/** A column that is used, with its unit and missing codes settled and its cells read. */
export interface SettledColumn {
  column: ColumnProposal;
  role: ValueRole;
  unit: FileUnit;
  scan: ColumnScan;
  missingCodes: string[];
}

/** The channel whose limits hold for a role. */
export function channelOfRole(role: ValueRole): ChannelName {
  if (role === "windU" || role === "windV") return "windSpeed";
  return role === "windTowards" ? "windFrom" : role;
}

export interface Settling {
  answers: ReadingAnswers;
  problems: ProblemList;
  lines: readonly number[];
  understood: Understood[];
  questions: ReadingQuestion[];
}

/** Settles the unit of a column that states none from its values, or asks; then finds its missing codes. */
export function settleColumn(
  column: ColumnProposal,
  scan: ColumnScan,
  speedUnit: FileUnit | null,
  state: Settling,
): SettledColumn | null {
  if (!isValueRole(column.role)) return null;
  const role = column.role;
  const unit = column.unit ?? unitOfValues(column, role, scan, speedUnit, state);
  const answer = answeredUnit(column, state.answers);
  if (answer !== null && column.statedUnit === null && !guessUnit(role, scan, speedUnit).sure) {
    ask(column, role, unit, unitUnknown(column), state);
  }
  const missingCodes = column.missingCodes ?? sentinelsOf(column, role, unit, scan, state);
  return { column, role, unit, scan, missingCodes };
}

function unitOfValues(
  column: ColumnProposal,
  role: ValueRole,
  scan: ColumnScan,
  speedUnit: FileUnit | null,
  state: Settling,
): FileUnit {
  const guessed = guessUnit(role, scan, speedUnit);
  // A unit that is stated but not known may be any: the values alone cannot settle it.
  const guess = { ...guessed, sure: guessed.sure && column.statedUnit === null };
  const unit = unitById(guess.id) ?? (unitsFor(role)[0] as FileUnit);
  state.understood.push({
    what: `Unit of “${column.name}”`,
    taken: unit.label,
    confidence: guess.sure ? "by content" : "assumed",
  });
  if (column.statedUnit !== null) {
    state.problems.add(
      "warning",
      "unknownUnit",
      `the unit “${column.statedUnit}” is not known`,
      "Choose the unit on the reading sheet.",
      { column: column.name },
    );
  }
  const asked = !guess.sure && !(role === "windGust" && speedUnit !== null);
  if (asked) ask(column, role, unit, unitUnknown(column), state);
  return unit;
}

function unitUnknown(column: ColumnProposal): string {
  return `The file does not say in which unit “${column.name}” is given.`;
}

/** The unit that an answer gave a column, or null. */
export function answeredUnit(column: ColumnProposal, answers: ReadingAnswers): string | null {
  return answers.columns?.[String(column.index)]?.unit ?? null;
}

function ask(column: ColumnProposal, role: ValueRole, unit: FileUnit, message: string, state: Settling): void {
  const answer = answeredUnit(column, state.answers);
  state.questions.push({
    key: "columns",
    column: column.index,
    needed: answer === null,
    message,
    options: unitsFor(role).map(({ id, label }) => ({ value: id, label })),
    suggestion: unit.id,
    ...(answer === null ? {} : { answer }),
  });
}

function guessUnit(role: ValueRole, scan: ColumnScan, speedUnit: FileUnit | null): { id: string; sure: boolean } {
  const middle = medianOf(scan.values);
  const range = rangeOf(scan.values);
  switch (CHANNEL_QUANTITIES[role][0]) {
    case "speed":
      return { id: speedUnit?.id ?? "m/s", sure: false };
    case "angle":
      return { id: "deg", sure: true };
    case "temperature":
      return middle > 150
        ? { id: "K", sure: true }
        : middle > 48
          ? { id: "°F", sure: true }
          : { id: "°C", sure: middle < 32 };
    case "pressure":
      if (middle > 50000) return { id: "Pa", sure: true };
      if (middle > 500) return { id: "hPa", sure: true };
      if (middle > 60 && middle < 120) return { id: "kPa", sure: true };
      return middle > 20 && middle < 33 ? { id: "inHg", sure: true } : { id: "hPa", sure: false };
    case "humidity":
      return range !== null && range.high <= 1.05 && range.high > 0 ? { id: "1", sure: true } : { id: "%", sure: true };
    case "waterRate":
      return { id: "mm", sure: false };
    default:
      return { id: "W/m²", sure: range !== null && range.high < 1600 && range.low > -1600 };
  }
}

/**
 * Repeated nines and the like count as missing where the column could not hold them as a measurement, or where they
 * stand alone far above everything else (one 99 among winds below 49). The cells are blanked and counted.
 */
function sentinelsOf(
  column: ColumnProposal,
  role: ValueRole,
  unit: FileUnit,
  scan: ColumnScan,
  state: Settling,
): string[] {
  const limits = CHANNEL_LIMITS[channelOfRole(role)];
  const component = role === "windU" || role === "windV";
  const low = component ? -limits.high : limits.low;
  const perInterval = isPerInterval(unit);
  const found = new Map<number, number>();
  let next = 0;
  for (const value of scan.values) {
    if (Number.isNaN(value)) continue;
    if (SENTINELS.has(value)) found.set(value, (found.get(value) ?? 0) + 1);
    else next = Math.max(next, Math.abs(value));
  }
  const codes: number[] = [];
  const doubtful: number[] = [];
  for (const [value] of found) {
    const converted = (value - unit.zero) * unit.factor;
    const impossible = perInterval ? value < low || value >= 9999 : converted < low || converted > limits.high;
    const alone = ["windSpeed", "windGust", "rain"].includes(role) && value > 2 * next && next > 0;
    if (impossible) codes.push(value);
    else if (alone) doubtful.push(value);
  }
  const all = new Set([...codes, ...doubtful]);
  if (all.size === 0) return [];
  const firstRow = scan.values.findIndex((value) => all.has(value));
  for (const [row, value] of scan.values.entries()) {
    if (!all.has(value)) continue;
    scan.values[row] = NaN;
    scan.missing += 1;
  }
  const shown = [...all].join(", ");
  state.understood.push({ what: `Missing code in “${column.name}”`, taken: shown, confidence: "by content" });
  if (doubtful.length > 0) {
    state.problems.add(
      "warning",
      "doubtfulCode",
      `${doubtful.join(", ")} stands far above all other values (largest ${next}) and was taken as a code for missing`,
      "If it was measured, clear the column's missing codes on the reading sheet.",
      { column: column.name, row: state.lines[firstRow] ?? 0 },
    );
    state.questions.push({
      key: "missingCodes",
      column: column.index,
      needed: false,
      message: `Does ${doubtful.join(", ")} in “${column.name}” mean missing?`,
      suggestion: doubtful.join(", "),
    });
  }
  return [...all].map(String);
}

/**
 * Heat fluxes are counted into the sea here and out of it elsewhere. Where the name does not say, latent heat, which
 * nearly always leaves the sea, tells by its sign; for the others the person is asked.
 */
export function settleHeatSense(settled: SettledColumn, state: Settling): SettledColumn {
  const { column, unit, role, scan } = settled;
  const known = column.senseKnown || statesHeatSense(column.name);
  if (!hasHeatSense(role) || answeredUnit(column, state.answers) !== null || known) return settled;
  const upward = unitById(`${unit.id} upward`);
  const leavesSea = role === "latent" && medianOf(scan.values) > 0 && upward !== null;
  const taken = leavesSea && upward !== null ? upward : unit;
  state.understood.push({
    what: `Sense of “${column.name}”`,
    taken: leavesSea ? "positive out of the sea, turned" : "positive into the sea",
    confidence: leavesSea ? "by content" : "assumed",
  });
  ask(
    column,
    role,
    taken,
    `The file does not say whether “${column.name}” is positive into the sea or out of it.`,
    state,
  );
  return { ...settled, unit: taken };
}
