/** Each headline figure of a response as it is read: number, unit, band, and what belongs beside it. */
import type { Band, Headline, TriggerOutcome } from "~/ocean/response";
import type { TriggerQuantity } from "~/ocean/scenario";
import { compassWord } from "~/units/compass";
import {
  formatBearing,
  formatQuantity,
  formatRange,
  SPACE,
  toDisplay,
  type FormattedQuantity,
} from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import { quantity, type ColourToken, type QuantityId } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

export const FIGURE_IDS = [
  "surfaceSalinity",
  "surfaceTemperature",
  "netDisplacement",
  "peakDrift",
  "peakStress",
  "transportAcross",
  "transportAlong",
  "layerDepth",
  "densityStep",
] as const;
export type FigureId = (typeof FIGURE_IDS)[number];

export const FIGURE_LABELS: Record<FigureId, string> = {
  surfaceSalinity: "Lowest surface salinity",
  surfaceTemperature: "Surface temperature, change",
  netDisplacement: "Net displacement of the layer",
  peakDrift: "Peak drift",
  peakStress: "Peak wind stress",
  transportAcross: "Transport across the shore",
  transportAlong: "Transport along the shore",
  layerDepth: "Layer depth at the end",
  densityStep: "Density step below the layer",
};

export const QUANTITY_OF: Record<FigureId, QuantityId> = {
  surfaceSalinity: "salinity",
  surfaceTemperature: "temperatureChange",
  netDisplacement: "displacement",
  peakDrift: "driftSpeed",
  peakStress: "stress",
  transportAcross: "transportTotal",
  transportAlong: "transportTotal",
  layerDepth: "layerDepth",
  densityStep: "densityStep",
};

const TRIGGERS_OF: Partial<Record<FigureId, TriggerQuantity>> = {
  surfaceSalinity: "salinity",
  peakDrift: "driftSpeed",
  peakStress: "stress",
  layerDepth: "layerDepth",
};

const SIGNED: readonly FigureId[] = ["surfaceTemperature", "transportAcross", "transportAlong"];

export interface FigureContext {
  units: UnitChoices;
  /** IANA zone or `UTC`. */
  zone: string;
  /** Whether the box has a shore: transport is then told across and along it, else towards east and north. */
  shore: boolean;
}

export interface HeadlineFigure {
  id: FigureId;
  label: string;
  colour: ColourToken;
  quantity: QuantityId;
  /** SI; null where nothing is known. */
  si: number | null;
  value: FormattedQuantity;
  /** SI; null where no ensemble ran. */
  band: Required<Band> | null;
  /** `31.6 to 32.2 g/kg, median 31.9`; empty without a band. */
  bandText: string;
  /** SI, trigger levels of this quantity. */
  levels: number[];
  /** What belongs beside the number: direction, time, change, hours beyond a trigger level. */
  remarks: string[];
}

/** Numbers of two or three figures, as the methods support. */
function decimalsOf(si: number, id: QuantityId, units: UnitChoices): number | undefined {
  if (id !== "displacement" && id !== "transportTotal") return undefined;
  return Math.abs(toDisplay(si, id, units)) >= 10 ? 0 : 1;
}

export function labelOf(id: FigureId, shore: boolean): string {
  if (shore) return FIGURE_LABELS[id];
  if (id === "transportAcross") return "Transport towards east";
  return id === "transportAlong" ? "Transport towards north" : FIGURE_LABELS[id];
}

/** `19 h`: whole hours from ten up. */
export function hoursText(hours: number): string {
  return `${hours >= 10 ? hours.toFixed(0) : hours.toFixed(1).replace(/\.0$/, "")}${SPACE}h`;
}

/** `below 32.5 g/kg for 19 h`, `never below 32.5 g/kg` */
export function triggerText(trigger: TriggerOutcome, units: UnitChoices): string {
  const level = `${trigger.side} ${formatQuantity(trigger.value, trigger.quantity, units).text}`;
  return trigger.hoursBeyond > 0 ? `${level} for ${hoursText(trigger.hoursBeyond)}` : `never ${level}`;
}

function towards(degrees: number | null): string {
  return degrees === null ? "without a direction" : `towards ${formatBearing(degrees)}, ${compassWord(degrees)}`;
}

function remarksOf(id: FigureId, headline: Headline, { units, zone, shore }: FigureContext): string[] {
  switch (id) {
    case "surfaceSalinity": {
      const { change, time } = headline.surfaceSalinity;
      return [
        `${formatQuantity(change, "salinityChange", units, { sign: true }).text} from the start`,
        formatTime(time, zone),
      ];
    }
    case "surfaceTemperature":
      return [`${formatQuantity(headline.surfaceTemperature.value, "temperature", units).text} at the end`];
    case "netDisplacement":
      return [towards(headline.netDisplacement.towards)];
    case "peakDrift": {
      const { towards: bearing, inertialShare, time } = headline.peakDrift;
      return [
        towards(bearing),
        `${formatQuantity(inertialShare, "share", units).text} of it inertial`,
        formatTime(time, zone),
      ];
    }
    case "peakStress":
      return [formatTime(headline.peakStress.time, zone)];
    case "transportAcross": {
      if (!shore) return ["positive towards east"];
      const { value } = headline.transportAcross;
      if (value === 0) return ["neither towards the shore nor away from it"];
      return [value > 0 ? "away from the shore: upwelling side" : "towards the shore: sinking side"];
    }
    case "transportAlong":
      return [shore ? "positive to the right when looking offshore" : "positive towards north"];
    case "layerDepth":
      return [];
    case "densityStep":
      return headline.densityStep.value === null ? ["nothing is known of the water below"] : ["at the end"];
  }
}

function bandOf({ p10, p50, p90 }: Band): Required<Band> | null {
  return p10 === undefined || p50 === undefined || p90 === undefined ? null : { p10, p50, p90 };
}

/** One figure of a headline, in the organisation's units. */
export function headlineFigure(id: FigureId, headline: Headline, context: FigureContext): HeadlineFigure {
  const { units } = context;
  const entry = headline[id];
  // The temperature is told as its change, which has a band of its own.
  const start =
    id === "surfaceTemperature" ? headline.surfaceTemperature.value - headline.surfaceTemperature.change : 0;
  const si = entry.value === null ? null : entry.value - start;
  const quantityId = QUANTITY_OF[id];
  const decimals = si === null ? undefined : decimalsOf(si, quantityId, units);
  const band = id === "surfaceTemperature" ? bandOf(headline.surfaceTemperature.changeBand ?? {}) : bandOf(entry);
  const triggers = headline.triggers.filter((trigger) => trigger.quantity === TRIGGERS_OF[id]);
  return {
    id,
    label: labelOf(id, context.shore),
    colour: quantity(quantityId).colour,
    quantity: quantityId,
    si,
    value: formatQuantity(si, quantityId, units, { decimals, sign: SIGNED.includes(id) }),
    band,
    bandText: band
      ? `${formatRange(band.p10, band.p90, quantityId, units, { decimals })}, median${SPACE}${formatQuantity(band.p50, quantityId, units, { decimals }).number}`
      : "",
    levels: triggers.map(({ value }) => value),
    remarks: [...triggers.map((trigger) => triggerText(trigger, units)), ...remarksOf(id, headline, context)],
  };
}

/** The six that a response opens with; what shares a line with another stands among its remarks. */
export function headlineRows(headline: Headline, context: FigureContext): HeadlineFigure[] {
  const figure = (id: FigureId) => headlineFigure(id, headline, context);
  const beside = (id: FigureId, name: string) => `${name} ${figure(id).value.text}`;
  const across = figure("transportAcross");
  const temperature = figure("surfaceTemperature");
  const along = figure("transportAlong");
  const step = headline.densityStep.value === null ? "density step not known" : beside("densityStep", "density step");
  return [
    figure("peakStress"),
    figure("peakDrift"),
    figure("netDisplacement"),
    {
      ...across,
      remarks: [
        ...across.remarks,
        `${context.shore ? "along it" : "towards north"} ${along.value.text}${context.shore ? ", positive to the right when looking offshore" : ""}`,
      ],
    },
    figure("surfaceSalinity"),
    { ...temperature, remarks: [...temperature.remarks, `${beside("layerDepth", "layer")} deep`, step] },
  ];
}
