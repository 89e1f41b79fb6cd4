import type { RowChannel } from "./assemble-series";
import type { ConvertedColumn } from "./convert-column";
import { conversionLabel, isPerInterval, type FileUnit } from "./file-units";
import { isSpread, type RowTimes } from "./rain-amounts";
import { CHANNEL_UNITS, type ChannelName, type ReadingAnswers, type ReadingStep, type Understood } from "./reading";
import { channelOfRole, type SettledColumn } from "./settle-columns";
import { normalDegrees, windFromComponents } from "./wind-vectors";

interface Said {
  steps: ReadingStep[];
  understood: Understood[];
}

/** Channels, one value a row, from converted columns: components become speed and direction, `towards` is turned about. */
export function channelsFromColumns(
  settled: readonly SettledColumn[],
  converted: ReadonlyMap<SettledColumn, ConvertedColumn>,
  answers: ReadingAnswers,
  times: RowTimes,
  said: Said,
): Map<ChannelName, RowChannel> {
  const channels = new Map<ChannelName, RowChannel>();
  const values = (column: SettledColumn): Float64Array => converted.get(column)?.values ?? new Float64Array();
  for (const column of settled) {
    const channel = channelOfRole(column.role);
    sayConversion(column, channel, times, said);
    if (column.role === "windU" || column.role === "windV") continue;
    const fromColumns = [column.column.name];
    if (column.role === "windFrom" || column.role === "windTowards") {
      const towards = (answers.directionSense ?? (column.role === "windTowards" ? "towards" : "from")) === "towards";
      const turn = towards ? 180 : 0;
      const from = values(column).map((value) => (Number.isNaN(value) ? NaN : normalDegrees(value + turn)));
      if (towards)
        said.steps.push({
          id: "towardsToFrom",
          label: "direction towards to direction from (+ 180°)",
          channel: "windFrom",
          count: countOf(from),
        });
      const norths = values(column).filter((value) => value === 360).length;
      if (norths > 0 && !towards)
        said.steps.push({ id: "north", label: "360° written as 0°", channel: "windFrom", count: norths });
      channels.set("windFrom", { values: from, amounts: null, fromColumns });
      continue;
    }
    channels.set(channel, { values: values(column), amounts: converted.get(column)?.amounts ?? null, fromColumns });
  }
  const u = settled.find(({ role }) => role === "windU");
  const v = settled.find(({ role }) => role === "windV");
  if (u !== undefined && v !== undefined && !channels.has("windSpeed")) {
    const fromColumns = [u.column.name, v.column.name];
    const eastward = values(u);
    const northward = values(v);
    const winds = Array.from(eastward, (value, row) => windFromComponents(value, northward[row] ?? NaN));
    const speed = Float64Array.from(winds, (wind) => wind.speed);
    channels.set("windSpeed", { values: speed, amounts: null, fromColumns });
    channels.set("windFrom", { values: Float64Array.from(winds, (wind) => wind.from), amounts: null, fromColumns });
    said.steps.push({
      id: "components",
      label: "eastward and northward components to speed and direction from",
      channel: "windSpeed",
      count: countOf(speed),
    });
  }
  return channels;
}

function countOf(values: Float64Array): number {
  return values.reduce((count, value) => (Number.isNaN(value) ? count : count + 1), 0);
}

/** Over which time an amount was added up, for the list of steps and for the reading sheet. */
function intervalWords(unit: FileUnit, times: RowTimes): { by: string; taken: string | null } {
  if (isSpread(unit, times)) {
    return {
      by: "; the interval is the time since the line before, and the rate stands where it began",
      taken: "an amount that fell since the line before; lines do not stand at equal steps",
    };
  }
  const { stepSeconds } = times;
  if (stepSeconds === null) return { by: "", taken: null };
  return {
    by: `; the interval is ${stepSeconds} s, the file's median step`,
    taken: `an amount over the ${stepSeconds} s up to each stamp`,
  };
}

function sayConversion(column: SettledColumn, channel: ChannelName, times: RowTimes, said: Said): void {
  const { scan, unit } = column;
  const name = column.column.name;
  const label = conversionLabel(unit, CHANNEL_UNITS[channel]);
  if (label !== "") {
    const { by, taken } = isPerInterval(unit) ? intervalWords(unit, times) : { by: "", taken: null };
    said.steps.push({ id: `unit:${unit.id}`, label: `${label}${by}`, channel, count: countOf(scan.values) });
    if (taken !== null) said.understood.push({ what: `“${name}”`, taken, confidence: "assumed" });
  }
  if (scan.trace > 0) {
    said.steps.push({ id: "trace", label: "trace of rain (T) read as 0", channel, count: scan.trace });
    said.understood.push({ what: `Trace in “${name}”`, taken: `${scan.trace} read as 0`, confidence: "by content" });
  }
  if (scan.variable > 0) {
    said.understood.push({
      what: `Variable direction in “${name}”`,
      taken: `${scan.variable} without a direction`,
      confidence: "by content",
    });
  }
  if (channel === "shortwave") {
    said.understood.push({
      what: `“${name}”`,
      taken: column.column.net ? "net of reflection" : "incoming: reflection at the surface is not taken off",
      confidence: column.column.senseKnown ? column.column.confidence : "assumed",
    });
  }
}
