import type { RowChannel } from "./assemble-series";
import type { ConvertedColumn } from "./convert-column";
import { conversionLabel } from "./file-units";
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
  stepSeconds: number | null,
  said: Said,
): Map<ChannelName, RowChannel> {
  const channels = new Map<ChannelName, RowChannel>();
  const values = (column: SettledColumn): Float64Array => converted.get(column)?.values ?? new Float64Array();
  for (const column of settled) {
    const channel = channelOfRole(column.role);
    sayConversion(column, channel, stepSeconds, said);
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

function sayConversion(column: SettledColumn, channel: ChannelName, stepSeconds: number | null, said: Said): void {
  const { scan, unit } = column;
  const name = column.column.name;
  const label = conversionLabel(unit, CHANNEL_UNITS[channel]);
  if (label !== "") {
    const interval =
      /interval/.test(label) && stepSeconds !== null
        ? `; the interval is ${stepSeconds} s, the file's median step`
        : "";
    said.steps.push({ id: `unit:${unit.id}`, label: `${label}${interval}`, channel, count: countOf(scan.values) });
    if (interval !== "")
      said.understood.push({
        what: `“${name}”`,
        taken: `an amount over the ${stepSeconds} s up to each stamp`,
        confidence: "assumed",
      });
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
      taken: /\bnet\b/i.test(name) ? "net of reflection" : "incoming: reflection at the surface is not taken off",
      confidence: "assumed",
    });
  }
}
