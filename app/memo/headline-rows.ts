/** The six headline figures of a response as rows of a memo's first table. */
import type { Band, Response, TriggerOutcome } from "~/ocean/response";
import { formatBearing, formatQuantity, formatRange } from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import type { QuantityId } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { bandEnds, bandMark, type SmallMark } from "~/figures/small-marks";
import type { HeadlineRow } from "./document";
import { distanceDecimals, hoursText, transportDecimals, type WordsContext } from "./words";

/** Rows in the order of the product: stress, drift, displacement, transport, salinity, then the layer's end. */
export function headlineRows(response: Response, context: Omit<WordsContext, "boxName">): HeadlineRow[] {
  return [
    stress(response, context),
    drift(response, context),
    displacement(response, context),
    transport(response, context),
    salinity(response, context),
    temperature(response, context),
  ];
}

type Context = Omit<WordsContext, "boxName">;

function stress({ headline }: Response, { units, zone }: Context): HeadlineRow {
  const { value, time } = headline.peakStress;
  return row("Peak wind stress", "stress", value, headline.peakStress, units, `at ${formatTime(time, zone)}`);
}

function drift({ headline }: Response, { units, zone }: Context): HeadlineRow {
  const { value, towards, time, inertialShare } = headline.peakDrift;
  const share = formatQuantity(inertialShare, "share", units).text;
  const base = row("Peak drift", "driftSpeed", value, headline.peakDrift, units, "");
  return {
    ...base,
    unit: withBearing(base.unit, towards),
    remark: `at ${formatTime(time, zone)}; ${share} inertial`,
  };
}

function displacement({ headline }: Response, { units }: Context): HeadlineRow {
  const { value, towards } = headline.netDisplacement;
  const decimals = distanceDecimals(value, units);
  const base = row("Net displacement", "displacement", value, headline.netDisplacement, units, "", decimals);
  return { ...base, unit: withBearing(base.unit, towards) };
}

function withBearing(unit: string, towards: number | null): string {
  return towards === null ? unit : `${unit} to ${formatBearing(towards)}`;
}

function transport({ headline }: Response, { units, shore }: Context): HeadlineRow {
  const { transportAcross: across, transportAlong: along } = headline;
  const sides = shore ? (["offshore", "onshore"] as const) : (["east", "west"] as const);
  const alongSides = shore ? (["to the right", "to the left"] as const) : (["north", "south"] as const);
  const told = (value: number) =>
    formatQuantity(Math.abs(value), "transportTotal", units, { decimals: transportDecimals(value, units) });
  const label = shore ? "Transport across the shore" : "Transport to the east";
  const base = row(label, "transportTotal", across.value, across, units, "", transportDecimals(across.value, units));
  const main = told(across.value);
  const low = across.p10 ?? Number.NaN;
  const high = across.p90 ?? Number.NaN;
  // The value is told by its size and side; so is its band, unless that holds both sides.
  const oneSided = low * high > 0 && low * across.value > 0;
  const [near, far] = [Math.abs(low), Math.abs(high)].sort((a, b) => a - b);
  const decimals = transportDecimals(across.value, units);
  const still = Number(main.number) === 0;
  return {
    ...base,
    value: main.number,
    band: oneSided
      ? formatRange(near, far, "transportTotal", units, { decimals })
      : base.band && `${base.band}, positive ${sides[0]}`,
    unit: still ? main.unit : `${main.unit} ${across.value > 0 ? sides[0] : sides[1]}`,
    remark: [
      ...(shore && !still ? [across.value > 0 ? "favours upwelling" : "favours sinking"] : []),
      `along: ${told(along.value).text} ${along.value >= 0 ? alongSides[0] : alongSides[1]}${shore ? ", looking offshore" : ""}`,
    ].join("; "),
  };
}

function salinity({ headline }: Response, { units, zone }: Context): HeadlineRow {
  const { value, change, time } = headline.surfaceSalinity;
  const triggers = headline.triggers.filter((trigger) => trigger.quantity === "salinity");
  const told = triggers.length > 0 ? triggers.map((trigger) => hoursBeyond(trigger, units)) : [];
  const changed = formatQuantity(change, "salinityChange", units, { sign: true }).text;
  const remark = [`${changed} at ${formatTime(time, zone)}`, ...told].join("; ");
  return row(
    "Lowest surface salinity",
    "salinity",
    value,
    headline.surfaceSalinity,
    units,
    remark,
    undefined,
    triggers[0],
  );
}

/** `19 h below 32.5 g/kg`, or `never below 32.5 g/kg` */
function hoursBeyond(trigger: TriggerOutcome, units: UnitChoices): string {
  const level = formatQuantity(trigger.value, trigger.quantity, units).text;
  const time = trigger.hoursBeyond > 0 ? hoursText(trigger.hoursBeyond) : "never";
  return `${time} ${trigger.side} ${level}`;
}

function temperature({ headline }: Response, { units }: Context): HeadlineRow {
  const { value, change, changeBand = {} } = headline.surfaceTemperature;
  const depth = formatQuantity(headline.layerDepth.value, "layerDepth", units).text;
  const step = headline.densityStep.value;
  const below = step === null ? "" : `; density step ${formatQuantity(step, "densityStep", units).text}`;
  const base = row("Surface temperature change", "temperatureChange", change, changeBand, units, "");
  return {
    ...base,
    value: formatQuantity(change, "temperatureChange", units, { sign: true }).number,
    remark: `to ${formatQuantity(value, "temperature", units).text}; layer ${depth} deep${below}`,
  };
}

function row(
  label: string,
  id: QuantityId,
  value: number,
  { p10, p90 }: Band,
  units: UnitChoices,
  remark: string,
  decimals?: number,
  trigger?: TriggerOutcome,
): HeadlineRow {
  const options = decimals === undefined ? {} : { decimals };
  const shown = formatQuantity(value, id, units, options);
  const banded = p10 !== undefined && p90 !== undefined;
  return {
    label,
    value: shown.number || "no value",
    unit: shown.unit,
    mark: rangeMark(id, value, { p10, p90 }, trigger?.value, units),
    band: banded ? formatRange(p10, p90, id, units, options) : "",
    remark,
  };
}

/** A mark is drawn only where there is something beside the value to compare it with. */
function rangeMark(
  id: QuantityId,
  value: number,
  { p10, p90 }: Band,
  trigger: number | undefined,
  units: UnitChoices,
): SmallMark | null {
  if ((p10 === undefined || p90 === undefined) && trigger === undefined) return null;
  return bandMark({ value, p10, p90, trigger, ...bandEnds([value, p10, p90, trigger], id, units) }, id, units);
}
