/** What a sound file may still mislead by: told on the reading sheet, never changed in silence. */
import type { ProblemList } from "./problem-list";
import type { RowTimes } from "./rain-amounts";
import type { SettledColumn } from "./settle-columns";

const DAY = 86_400;
const MAGNETIC = /\bmag(?:netic|netisch|netico|netique|n)?\b|missweisend|\bdeg ?m\b|°\s?m\b/i;
const INCOMING = /incoming|global|\bghi\b|down|solar|insolat|\bssrd\b|\brsds\b|einstrahl/i;
const NET = /\bnet\b|netto|\bnette?\b|absorb|\bssr\b/i;
/** Formats whose stations stand on land. */
const ON_LAND = new Set(["airportText", "hourlyText"]);
/** Below a quarter of an hour a single tip of a bucket is a rate that never fell. Common practice, no source. */
const SHORT_INTERVAL = 15 * 60;
/** A gauge loses a tenth of the rain and more in wind above this, m/s. From memory of gauge comparisons (WMO). */
const UNDERCATCH_WIND = 10;

/**
 * Adds a note for each way in which the record may be read wrongly although every value can be read.
 * @param settled columns with their role and unit @param format id of the reader
 */
export function addCautions(
  settled: readonly SettledColumn[],
  times: RowTimes,
  format: string,
  problems: ProblemList,
): void {
  for (const column of settled) {
    const { name } = column.column;
    const written = `${name} ${column.column.statedUnit ?? ""}`;
    if (column.role === "windFrom" || column.role === "windTowards") {
      if (MAGNETIC.test(written)) magneticDirection(name, problems);
    }
    if (column.role === "shortwave" && INCOMING.test(written) && !NET.test(written)) incomingShortwave(name, problems);
    if (column.role === "rain" && column.unit.quantity === "waterAmount") rainCautions(column, times, problems);
  }
  windCautions(settled, format, problems);
}

function magneticDirection(column: string, problems: ProblemList): void {
  problems.add(
    "warning",
    "magneticDirection",
    "its name says magnetic north, and nothing was turned: directions here are degrees true",
    "Add the declination of the place (east positive) to the directions of the file, or answer for it in the memo.",
    { column },
  );
}

function incomingShortwave(column: string, problems: ProblemList): void {
  problems.add(
    "note",
    "incomingShortwave",
    "radiation that comes in is not all taken by the sea: about 6 % is turned back",
    "Use net shortwave where there is any, or take 0.94 of it (albedo of the open sea, common practice).",
    { column },
  );
}

function rainCautions({ column, scan, unit }: SettledColumn, times: RowTimes, problems: ProblemList): void {
  const { stepSeconds } = times;
  if (stepSeconds === null) return;
  if (stepSeconds === DAY) {
    problems.add(
      "note",
      "rainDay",
      "one amount a day: the day of a rain gauge often ends at 09:00 local time, not at midnight, and is taken here to end at its stamp",
      "Check the station's rain day; a day's rain cannot tell when in a storm it fell.",
      { column: column.name },
    );
    return;
  }
  const tip = tipOf(scan.values);
  if (tip === null || stepSeconds > SHORT_INTERVAL) return;
  const millimetres = tip * unit.factor;
  const rate = (millimetres * 3600) / stepSeconds;
  problems.add(
    "note",
    "tipResolution",
    `all amounts are whole tips of ${Number(millimetres.toPrecision(3))} mm, so that one tip is a rate of ${Number(rate.toPrecision(3))} mm/h and nothing below that can be told`,
    "Give the rain of longer intervals where peaks of the rate matter; totals are right.",
    { column: column.name },
  );
}

const TIPS_NEEDED = 10;

/** The amount that all others are whole multiples of, where it is met often; null where there is none. */
function tipOf(values: Float64Array): number | null {
  const wet = values.filter((value) => value > 0);
  if (wet.length < TIPS_NEEDED) return null;
  const tip = wet.reduce((least, value) => Math.min(least, value), Number.POSITIVE_INFINITY);
  const whole = wet.every((value) => Math.abs(value / tip - Math.round(value / tip)) < 1e-6);
  const single = wet.filter((value) => value === tip).length;
  // Amounts rounded to a tenth are multiples of a tenth too, but are seldom as often the least as tips are.
  return whole && tip >= 0.1 && single >= wet.length / 2 ? tip : null;
}

function windCautions(settled: readonly SettledColumn[], format: string, problems: ProblemList): void {
  const wind = settled.find(({ role }) => role === "windSpeed");
  if (wind && ON_LAND.has(format)) {
    problems.add(
      "note",
      "landStation",
      "the station stands on land, where the wind is weaker and turned against that of the open sea",
      "Use a buoy or a reanalysis beside it where there is one, and say so in the memo.",
      { column: wind.column.name },
    );
  }
  const rain = settled.find(({ role }) => role === "rain");
  if (!wind || !rain) return;
  const strongest = wind.scan.values.reduce((most, value) => (value > most ? value : most), 0) * wind.unit.factor;
  if (strongest <= UNDERCATCH_WIND || !rain.scan.values.some((value) => value > 0)) return;
  problems.add(
    "note",
    "undercatch",
    "in strong wind a gauge catches less rain than falls",
    "Take the rain as a lower bound; a scenario with more rain shows what that changes.",
    { column: rain.column.name },
  );
}
