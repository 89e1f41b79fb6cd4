/** The ledger as it is read: everything formatted in the organisation's units and the project's time zone. */
import { formatPosition } from "~/area/format-coordinates";
import { measureBox } from "~/area/measure-box";
import type { ResponseWithoutSeries } from "./result-store.server";
import { estimateCode, sheetLabel } from "./estimate-code";
import { needsRun, isUnderWay, stateSentence, type EstimateState, type StateKind } from "./estimate-state";
import { headlineFigure, type FigureContext, type FigureId } from "./headline-figures";
import type { Ledger, LedgerCell } from "./load-ledger.server";
import { linearAt } from "./resample";
import type { StormForcing } from "./storm-forcing";
import { extremes } from "~/figures/extremes";
import { heldTotal } from "~/figures/forcing-stack";
import { driftArrow, spark, type SmallMark } from "~/figures/small-marks";
import type { FitSeverity } from "~/ocean/response";
import { compassWord } from "~/units/compass";
import { formatQuantity, fromDisplay, toDisplay } from "~/units/format-quantity";
import { zoneClock } from "~/units/format-time";
import type { ColourToken } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

export interface LedgerCellView {
  boxId: string;
  stormId: string;
  estimateId: string;
  code: string;
  state: StateKind;
  /** `out of date: water column changed` */
  stateText: string;
  needsRun: boolean;
  /** Number and unit; null where nothing was computed. */
  value: string | null;
  colour: ColourToken;
  band: string;
  remark: string;
  arrow: SmallMark | null;
  /** The gravest note where the method does not fit well. */
  fit: { severity: FitSeverity; message: string } | null;
  problems: string[];
  /** Column and sheet of the run. */
  made: string;
}

export interface LedgerView {
  boxes: { id: string; name: string; facts: string[] }[];
  storms: { id: string; name: string; facts: string[]; spark: SmallMark | null }[];
  cells: LedgerCellView[];
  /** Diameter of the arrows' circle; empty where no arrow is drawn. */
  fullCircle: string;
  underWay: boolean;
  toRun: number;
  /** Whether cells may differ by column or sheet, and so have to name theirs. */
  several: boolean;
}

export interface LedgerContext {
  figure: FigureId;
  units: UnitChoices;
  zone: string;
  jobNumber: string;
}

const SPARK_SAMPLES = 120;
/** Diameters that are easy to think in, in the unit shown. */
const CIRCLES = [1, 2, 5, 10, 20, 40, 60, 100, 200, 400, 600, 1000, 2000, 5000];

function boxFacts(box: Ledger["boxes"][number], units: UnitChoices): string[] {
  const { areaKm2, centroid } = measureBox(box.polygon);
  const depth = box.waterDepth === null ? "" : ` · ${formatQuantity(box.waterDepth, "depth", units).text} deep`;
  const facts = [formatPosition(centroid), formatQuantity(areaKm2 * 1e6, "area", units).text + depth];
  if (box.distanceToShore === null) return facts;
  const away = formatQuantity(box.distanceToShore, "distance", units).text;
  const where = box.shoreNormal === null ? "" : ` to the ${compassWord(box.shoreNormal + 180)}`;
  return [...facts, `shore ${away}${where}`];
}

function windSpark({ time, windSpeed }: StormForcing, units: UnitChoices): SmallMark {
  const [start, end] = [time[0], time[time.length - 1]];
  const even = Array.from({ length: SPARK_SAMPLES }, (_, index) =>
    linearAt({ time, values: windSpeed }, start + ((end - start) * index) / (SPARK_SAMPLES - 1)),
  );
  return spark(even, "windSpeed", units);
}

function stormFacts({ storm, reading }: Ledger["storms"][number], { units, zone }: LedgerContext): string[] {
  if (storm.startsAt === null || storm.endsAt === null) return ["no confirmed record yet"];
  const clock = zoneClock(zone);
  const facts = [`${clock.date(storm.startsAt)} to ${clock.date(storm.endsAt)} ${clock.zone}`];
  const { forcing } = reading;
  if (!forcing) return [...facts, ...reading.problems.slice(0, 1).map(({ message }) => message)];
  const peak = extremes(forcing.windSpeed)?.max;
  const said = [`peak ${formatQuantity(peak, "windSpeed", units).text}`];
  if (forcing.rain) said.push(`rain ${formatQuantity(heldTotal(forcing.time, forcing.rain), "rainTotal", units).text}`);
  if (storm.track) facts.push("parametric wind from a track");
  return [...facts, said.join(" · ")];
}

/** Metres across the circle, so that the longest displacement just fits. */
function circleFor(cells: LedgerCell[], units: UnitChoices): number {
  const longest = Math.max(0, ...cells.map(({ response }) => response?.headline.netDisplacement.value ?? 0));
  const shown = toDisplay(longest, "displacement", units);
  return fromDisplay(CIRCLES.find((size) => size >= shown) ?? shown, "displacement", units);
}

/** Severities that a cell has to tell, the gravest first. */
const TOLD: FitSeverity[] = ["doNotUse", "caution"];

function gravestNote({ fitNotes }: ResponseWithoutSeries): LedgerCellView["fit"] {
  for (const severity of TOLD) {
    const note = fitNotes.find((entry) => entry.severity === severity);
    if (note) return { severity, message: note.message };
  }
  return null;
}

function problemsOf(state: EstimateState): string[] {
  return state.kind === "failed" ? state.problems.map(({ message }) => message) : [];
}

function presentCell(cell: LedgerCell, ledger: Ledger, context: LedgerContext, fullCircle: number): LedgerCellView {
  const { estimate, state, response } = cell;
  const { units, zone } = context;
  const shore = ledger.boxes.find(({ id }) => id === estimate.studyBoxId)?.shoreNormal ?? null;
  const figureContext: FigureContext = { units, zone, shore: shore !== null };
  const figure = response && headlineFigure(context.figure, response.headline, figureContext);
  const water = ledger.columns.find(({ id }) => id === estimate.waterColumnId)?.name ?? "";
  const sheet = ledger.sheets.find(({ id }) => id === estimate.methodSheetId);
  const net = response?.headline.netDisplacement;
  return {
    boxId: estimate.studyBoxId,
    stormId: estimate.stormId,
    estimateId: estimate.id,
    code: estimateCode(context.jobNumber, estimate.number),
    state: state.kind,
    stateText: stateSentence(state),
    needsRun: needsRun(state),
    value: figure ? figure.value.text : null,
    colour: figure?.colour ?? "ink",
    band: figure?.bandText ?? "",
    remark: figure?.remarks[0] ?? "",
    arrow: net ? driftArrow({ distance: net.value, towards: net.towards, fullCircle }, units) : null,
    fit: response && gravestNote(response),
    problems: problemsOf(state),
    made: [water, ...(sheet ? [sheetLabel(sheet)] : [])].join(" · "),
  };
}

export function presentLedger(ledger: Ledger, context: LedgerContext): LedgerView {
  const fullCircle = circleFor(ledger.cells, context.units);
  const cells = ledger.cells.map((cell) => presentCell(cell, ledger, context, fullCircle));
  return {
    boxes: ledger.boxes.map((box) => ({ id: box.id, name: box.name, facts: boxFacts(box, context.units) })),
    storms: ledger.storms.map((entry) => ({
      id: entry.storm.id,
      name: entry.storm.name,
      facts: stormFacts(entry, context),
      spark: entry.reading.forcing && windSpark(entry.reading.forcing, context.units),
    })),
    cells,
    fullCircle: cells.some(({ arrow }) => arrow)
      ? formatQuantity(fullCircle, "displacement", context.units, { decimals: 0 }).text
      : "",
    underWay: ledger.cells.some(({ state }) => isUnderWay(state)),
    toRun: cells.filter((cell) => cell.needsRun).length,
    several: ledger.columns.length > 1 || ledger.sheets.length > 1,
  };
}
