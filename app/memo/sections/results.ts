/** What the estimates say: side by side, trigger levels, figures, and how well their budgets close. */
import type { Budget } from "~/ocean/response";
import { formatBearing, formatQuantity, formatRange } from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import type { QuantityId } from "~/units/quantities";
import type { Block, Run } from "../document";
import { parameterValue } from "../method-words";
import type { MemoEstimate, MemoInput } from "../memo-input";
import { distanceDecimals, hoursText, transportDecimals } from "../words";
import { cell, column, type FigureNumbers, paragraph } from "./section";

export function resultBlocks(input: MemoInput, numbers: FigureNumbers): Block[] {
  if (input.estimates.length === 0) return [];
  return [
    comparison(input),
    ...triggerBlocks(input),
    ...input.estimates.flatMap(({ code, figures }, index) =>
      // The first figure of the first estimate stands beside the answer.
      (index === 0 ? figures.slice(1) : figures).map((figure) => numbers.block(figure, code)),
    ),
  ];
}

type Told = (estimate: MemoEstimate) => string;

function comparison({ estimates, units, project }: MemoInput): Block {
  const banded = (value: number | null, id: QuantityId, p10?: number, p90?: number, decimals?: number) => {
    const options = decimals === undefined ? {} : { decimals };
    const text = formatQuantity(value, id, units, options).text;
    return p10 === undefined || p90 === undefined ? text : `${text} (${formatRange(p10, p90, id, units, options)})`;
  };
  const transportLabels = labelsOf(estimates);
  const rows: [label: string, told: Told][] = [
    ["Storm", ({ stormName }) => stormName],
    ["Water column", ({ waterName }) => waterName],
    ["Method sheet", ({ methodSheetName }) => methodSheetName],
    [
      "Peak wind stress",
      ({
        response: {
          headline: { peakStress: it },
        },
      }) => banded(it.value, "stress", it.p10, it.p90),
    ],
    ["its time", ({ response }) => formatTime(response.headline.peakStress.time, project.zone)],
    [
      "Peak drift",
      ({
        response: {
          headline: { peakDrift: it },
        },
      }) => `${banded(it.value, "driftSpeed", it.p10, it.p90)} to ${formatBearing(it.towards)}`,
    ],
    [
      "Inertial share of peak drift",
      ({ response }) => formatQuantity(response.headline.peakDrift.inertialShare, "share", units).text,
    ],
    [
      "Net displacement",
      ({
        response: {
          headline: { netDisplacement: it },
        },
      }) =>
        `${banded(it.value, "displacement", it.p10, it.p90, distanceDecimals(it.value, units))} to ${formatBearing(it.towards)}`,
    ],
    [
      transportLabels.across,
      ({
        response: {
          headline: { transportAcross: it },
        },
      }) => banded(it.value, "transportTotal", it.p10, it.p90, transportDecimals(it.value, units)),
    ],
    [
      transportLabels.along,
      ({
        response: {
          headline: { transportAlong: it },
        },
      }) => banded(it.value, "transportTotal", it.p10, it.p90, transportDecimals(it.value, units)),
    ],
    [
      "Lowest surface salinity",
      ({
        response: {
          headline: { surfaceSalinity: it },
        },
      }) => banded(it.value, "salinity", it.p10, it.p90),
    ],
    [
      "its change from the start",
      ({ response }) =>
        formatQuantity(response.headline.surfaceSalinity.change, "salinityChange", units, { sign: true }).text,
    ],
    [
      "Surface temperature at the end",
      ({
        response: {
          headline: { surfaceTemperature: it },
        },
      }) => banded(it.value, "temperature", it.p10, it.p90),
    ],
    [
      "its change from the start",
      ({ response }) =>
        formatQuantity(response.headline.surfaceTemperature.change, "temperatureChange", units, { sign: true }).text,
    ],
    [
      "Layer depth at the end",
      ({
        response: {
          headline: { layerDepth: it },
        },
      }) => banded(it.value, "layerDepth", it.p10, it.p90),
    ],
    [
      "Density step below the layer",
      ({
        response: {
          headline: { densityStep: it },
        },
      }) => banded(it.value, "densityStep", it.p10, it.p90),
    ],
    ["Input hash", ({ response }) => response.inputs],
    ["Engine", ({ response }) => response.engine],
  ];
  return {
    kind: "table",
    caption: "Estimates in numbers. Drift and displacement point where the water goes to, in degrees true.",
    columns: [column("Figure"), ...estimates.map(({ code, boxName }) => column(`${code}, ${boxName}`))],
    rows: rows.map(([label, told]) => [cell(label), ...estimates.map((estimate) => cell(told(estimate)))]),
  };
}

/** What the two transports point along depends on whether a box has a shore. */
function labelsOf(estimates: readonly MemoEstimate[]): { across: string; along: string } {
  const shores = new Set(estimates.map(({ shore }) => shore));
  const across = shores.has(true) ? ["across the shore, positive offshore"] : [];
  const along = shores.has(true) ? ["along the shore, positive to the right looking offshore"] : [];
  if (shores.has(false)) {
    across.push(shores.has(true) ? "or, without a shore, to the east" : "to the east");
    along.push(shores.has(true) ? "or, without a shore, to the north" : "to the north");
  }
  return { across: `Ekman transport ${across.join("; ")}`, along: `Ekman transport ${along.join("; ")}` };
}

function triggerBlocks({ estimates, units, project }: MemoInput): Block[] {
  const rows = estimates.flatMap(({ code, response }) =>
    response.headline.triggers.map((trigger): Run[][] => [
      cell(code),
      cell(
        `${triggerNames[trigger.quantity]} ${trigger.side} ${formatQuantity(trigger.value, trigger.quantity, units).text} for ${hoursText(trigger.hours)}`,
      ),
      cell(hoursText(trigger.hoursBeyond)),
      cell(hoursText(trigger.longestSpell)),
      cell(trigger.firstAt === null ? "never" : formatTime(trigger.firstAt, project.zone)),
      [{ text: trigger.met ? "met" : "not met", bold: trigger.met }],
    ]),
  );
  if (rows.length === 0) return [];
  return [
    {
      kind: "table",
      caption: "Trigger levels.",
      columns: [
        column("Estimate"),
        column("Trigger level"),
        column("Time beyond", "", "right"),
        column("Longest spell", "", "right"),
        column("First"),
        column("Limit"),
      ],
      rows,
    },
  ];
}

const triggerNames = {
  salinity: "salinity",
  temperature: "temperature",
  driftSpeed: "drift",
  stress: "wind stress",
  layerDepth: "layer depth",
  density: "density",
} as const;

/** How the water's content changed against what was put in, which tells whether the sums were done right. */
export function budgetBlocks({ estimates, independentCheck }: MemoInput): Block[] {
  const rows = estimates.flatMap(({ code, response: { budgets } }) =>
    (["heat", "salt", "momentum"] as const).map((name) => budgetRow(code, name, budgets[name])),
  );
  return [
    ...(rows.length > 0
      ? [
          {
            kind: "table" as const,
            caption: "Budgets per m² of sea: change of content, input, and what does not close.",
            columns: [
              column("Estimate"),
              column("Budget"),
              column("Change", "", "right"),
              column("Input", "", "right"),
              column("Residual", "", "right"),
            ],
            rows,
          },
        ]
      : []),
    ...(independentCheck
      ? [
          paragraph(independentCheck.text),
          {
            kind: "paragraph" as const,
            style: "small" as const,
            runs: [{ text: `Independent check by ${independentCheck.by}, ${independentCheck.date}.` }],
          },
        ]
      : []),
  ];
}

const BUDGET_UNITS = { heat: "J/m²", salt: "kg/m²", momentum: "kg/(m s)" } as const;

function budgetRow(code: string, name: keyof typeof BUDGET_UNITS, { change, input, residual }: Budget): Run[][] {
  const told = (value: number) => cell(`${parameterValue(Number(value.toPrecision(3)))}\u00a0${BUDGET_UNITS[name]}`);
  return [cell(code), cell(name), told(change), told(input), told(residual)];
}
