/** A response in words and formatted numbers, as its page shows them. */
import { headlineRows, hoursText, triggerText, type FigureContext, type HeadlineFigure } from "./headline-figures";
import {
  isInUse,
  METHOD_KEYS,
  MODEL_LABELS,
  PARAMETERS,
  parameterText,
  scientific,
  tidyNumber,
} from "./method-parameters";
import { bandEnds, bandMark, type SmallMark } from "~/figures/small-marks";
import type { FitSeverity, Response, TriggerOutcome } from "~/ocean/response";
import { formatTime } from "~/units/format-time";
import { quantity, type ColourToken } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

export interface HeadlineRowView {
  label: string;
  number: string;
  unit: string;
  colour: ColourToken;
  band: string;
  /** Where there is a band or a trigger level to set the number against. */
  mark: SmallMark | null;
  remarks: string[];
}

export interface TriggerView {
  level: string;
  verdict: string;
  met: boolean;
  detail: string;
}

export interface MethodRowView {
  label: string;
  /** Whether the model in use asks for it. */
  inUse: boolean;
  value: string;
  origin: "chosen" | "default";
  source: string;
}

export interface BudgetView {
  label: string;
  unit: string;
  change: string;
  input: string;
  residual: string;
}

export interface ResponseView {
  headline: HeadlineRowView[];
  triggers: TriggerView[];
  fitNotes: { severity: FitSeverity; word: string; message: string; source: string }[];
  recommendation: string;
  method: MethodRowView[];
  budgets: BudgetView[];
  caution: string;
}

export const SEVERITY_WORDS: Record<FitSeverity, string> = { ok: "fits", caution: "caution", doNotUse: "do not use" };

function markOf(figure: HeadlineFigure, units: UnitChoices): SmallMark | null {
  const { si, band, levels } = figure;
  if (si === null || (!band && levels.length === 0)) return null;
  const ends = bandEnds([si, band?.p10, band?.p90, ...levels], figure.quantity, units);
  return bandMark({ value: si, p10: band?.p10, p90: band?.p90, trigger: levels[0], ...ends }, figure.quantity, units);
}

/** Where an ensemble ran: the range of hours, and in how many members the limit was met. */
function spreadOf({ p10, p90, metInMembers }: TriggerOutcome, computed: number | undefined): string[] {
  if (p10 === undefined || p90 === undefined || metInMembers === undefined || computed === undefined) return [];
  return [
    `beyond for ${hoursText(p10)} to ${hoursText(p90)} (10th to 90th percentile)`,
    `met in ${metInMembers} of ${computed} members`,
  ];
}

function presentTrigger(
  trigger: TriggerOutcome,
  computed: number | undefined,
  { units, zone }: FigureContext,
): TriggerView {
  const { met, hours, firstAt, longestSpell } = trigger;
  const first = firstAt === null ? [] : [`first ${formatTime(firstAt, zone)}`];
  const spell = trigger.hoursBeyond > 0 ? [`longest spell ${longestSpell.toFixed(1)}\u00a0h`] : [];
  return {
    level: `${quantity(trigger.quantity).name} ${triggerText(trigger, units)}`,
    met,
    verdict: met ? "met" : "not met",
    detail: [...first, ...spell, `counts as met from ${hours}\u00a0h`, ...spreadOf(trigger, computed)].join(" · "),
  };
}

const BUDGETS = [
  { key: "heat", label: "Heat", unit: "J/m²" },
  { key: "salt", label: "Salt", unit: "kg/m²" },
  { key: "momentum", label: "Momentum", unit: "kg/m/s" },
] as const;

function recommendationOf({ method, recommendedModel, recommendation }: Response): string {
  const same = method.model?.value === recommendedModel;
  const label = MODEL_LABELS[recommendedModel];
  return `${same ? "The model in use is the one recommended here" : `Recommended here: ${label}`}. ${recommendation}`;
}

export function presentResponse(response: Response, context: FigureContext): ResponseView {
  const { headline, fitNotes, method, budgets, caution } = response;
  return {
    headline: headlineRows(headline, context).map((figure) => ({
      label: figure.label,
      number: figure.value.number || "not known",
      unit: figure.value.unit,
      colour: figure.colour,
      band: figure.bandText,
      mark: markOf(figure, context.units),
      remarks: figure.remarks,
    })),
    triggers: headline.triggers.map((trigger) => presentTrigger(trigger, response.uncertainty?.computed, context)),
    fitNotes: fitNotes.map(({ severity, message, source }) => ({
      severity,
      word: SEVERITY_WORDS[severity],
      message,
      source,
    })),
    recommendation: recommendationOf(response),
    method: METHOD_KEYS.flatMap((key) => {
      const entry = method[key];
      if (!entry) return [];
      const { value, unit, origin, source } = entry;
      return [
        {
          label: PARAMETERS[key].label,
          inUse: isInUse(key, method),
          value: parameterText(key, value, unit),
          origin,
          source,
        },
      ];
    }),
    budgets: BUDGETS.map(({ key, label, unit }) => ({
      label,
      unit,
      change: tidyNumber(budgets[key].change),
      input: tidyNumber(budgets[key].input),
      residual: scientific(budgets[key].residual, 2),
    })),
    caution,
  };
}
