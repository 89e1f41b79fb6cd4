import { ProblemList } from "../problem-list";
import { UnreadableFile, type Understood } from "../reading";
import { openText, type SourceFile } from "../source-file";
import { castColumns, type CastColumn } from "./cast-columns";
import { castDepths } from "./cast-depths";
import { castHalves, type CastHalves } from "./cast-halves";
import { lackingOf, unusable } from "./cast-lacking";
import { castQuestion, columnQuestions } from "./cast-questions";
import type { CastAnswers, CastChannel, CastQuestion, CastReading, TableReading } from "./cast-reading";
import { castSalinity } from "./cast-salinity";
import { castSamples } from "./cast-samples";
import { castStatistics } from "./cast-statistics";
import type { CastTable } from "./cast-table";
import { onScaleOf1990 } from "./cast-temperature";
import { numbersIn, valuesOf } from "./cast-values";
import { exchangeTables, isExchangeCast } from "./exchange-cast";
import { instrumentTables, isInstrumentCast } from "./instrument-cast";
import { isPlainCast, plainTables } from "./plain-cast";

interface CastForm {
  id: string;
  label: string;
  recognises: (source: SourceFile) => boolean;
  tables: (source: SourceFile, problems: ProblemList) => CastTable[];
}

const PLAIN: CastForm = { id: "castPlain", label: "delimited cast", recognises: isPlainCast, tables: plainTables };
const FORMS: readonly CastForm[] = [
  { id: "castExchange", label: "exchange file", recognises: isExchangeCast, tables: exchangeTables },
  { id: "castInstrument", label: "instrument's ASCII file", recognises: isInstrumentCast, tables: instrumentTables },
  PLAIN,
];

/** Whether a text is unmistakably a cast: a form of its own, or a table of salt and heat by depth without a time. */
export function isCastText(source: SourceFile): boolean {
  return FORMS.some(({ recognises }) => recognises(source));
}

/**
 * Reads a cast: temperature and salinity down the water, whatever the file measures depth and salt by.
 * @param input.answers the same bytes, name and answers give the same reading
 * @returns samples of one half, from the surface down, depth in m, temperature in situ (ITS-90)
 * @throws UnreadableFile where nothing can be read; its `problems` say why and what to do
 */
export function readCast(input: { bytes: Uint8Array; fileName: string; answers?: CastAnswers }): CastReading {
  const { bytes, fileName, answers = {} } = input;
  const problems = new ProblemList();
  const source = openText(bytes, fileName, problems);
  if (!source) throw new UnreadableFile(problems.toArray());
  const form = FORMS.find(({ recognises }) => recognises(source)) ?? PLAIN;
  const tables = form.tables(source, problems);
  const table = tables.find(({ label }) => label === answers.cast) ?? tables.at(0);
  const columns = table ? castColumns(table, (index) => numbersIn(table, index), answers) : [];
  if (!table || columns.length === 0) return refuseNames(fileName, table, problems);
  if (table.rows.length === 0) return refuse(problems, "onlyHeader", `“${fileName}” has names but no records`);
  const reading = readTable(table, columns, answers, problems);
  const several = castQuestion(tables, table, answers);
  return {
    kind: "cast",
    format: form.id,
    formatLabel: form.label,
    fileName,
    rows: table.rows.length,
    time: table.time,
    latitude: latitudeOf(table),
    longitude: table.longitude,
    ...reading,
    understood: [{ what: "Format", taken: form.label, confidence: "by content" }, ...reading.understood],
    questions: [...(several ? [several] : []), ...reading.questions],
    problems: problems.toArray(),
    leftOut: table.names.filter((_, index) => !columns.some((column) => column.index === index)),
  };
}

function refuse(problems: ProblemList, code: string, what: string): never {
  problems.add("error", code, what, "Give the whole file.");
  throw new UnreadableFile(problems.toArray());
}

function refuseNames(fileName: string, table: CastTable | undefined, problems: ProblemList): never {
  const seen = table ? `; columns seen: ${table.names.join(", ").slice(0, 300)}` : "";
  problems.add(
    "error",
    "noCast",
    `“${fileName}” has no line of column names with a depth or pressure and a temperature${seen}`,
    "Name the columns, as `depth (m),temperature (°C),salinity`.",
  );
  throw new UnreadableFile(problems.toArray());
}

function latitudeOf({ latitude }: CastTable): number | null {
  return latitude !== null && Math.abs(latitude) <= 90 ? latitude : null;
}

function readTable(
  table: CastTable,
  columns: readonly CastColumn[],
  answers: CastAnswers,
  problems: ProblemList,
): TableReading {
  const columnOf = (channel: CastChannel) => columns.find((column) => column.channel === channel);
  const unitText = (channel: CastChannel) => table.units[columnOf(channel)?.index ?? -1] ?? null;
  const values = new Map(columns.map((column) => [column.channel, valuesOf(table, column, problems)]));
  const understood = [...headerNotes(table), ...columns.map(columnNote)];
  const questions = columnQuestions(columns, table, answers);

  const temperatureColumn = columnOf("temperature");
  let temperature: Float64Array = new Float64Array(table.rows.length).fill(NaN);
  if (temperatureColumn) {
    const written = values.get("temperature") ?? temperature;
    const scaled = onScaleOf1990(written, temperatureColumn.name, unitText("temperature"), answers);
    temperature = scaled.values;
    values.set("temperature", temperature);
    understood.push(scaled.note);
    questions.push(scaled.question);
  }
  const depths = castDepths(values, latitudeOf(table), answers);
  const { pressure, depth } = depths;
  const salt = castSalinity(values, temperature, pressure, columnOf("salinity"), unitText("salinity"), answers);
  understood.push(...depths.notes, ...(salt.note ? [salt.note] : []));
  questions.push(...[depths.question, salt.question].filter((question) => question !== null));

  const lacking = lackingOf(columns);
  if (lacking.length > 0) {
    return unusable(lacking, table, { answers, problems, understood, questions, values });
  }
  const halves = castHalves(pressure);
  const half = answers.half ?? (halves.hasDowncast ? "down" : "up");
  if (halves.hasUpcast) questions.push(halfQuestion(half, halves, answers));
  if (half === "down" && halves.downStart > 0) {
    const taken = `the first ${halves.downStart} records are left out`;
    understood.push({ what: "Soak at the surface", taken, confidence: "by content" });
  }
  const profiles = { pressure, depth, temperature, salinity: salt.values };
  const samples = castSamples(orderOf(half, halves, pressure.length), profiles, understood);
  if (samples.length < 2) {
    problems.add("error", "tooShort", "fewer than two depths can be used", "Give a cast of the whole water.");
  }
  for (const [channel, list] of [
    ["pressure", pressure],
    ["depth", depth],
    ["salinity", salt.values],
  ] as const) {
    if (list) values.set(channel, list);
  }
  const derived = {
    pressure: "depth, after Saunders (1981)",
    depth: "pressure, after Saunders (1981)",
    salinity: salt.derivedFrom,
  };
  return {
    channels: describe(values, columns, derived),
    salinityScale: salt.scale,
    samples,
    half,
    understood,
    questions,
  };
}

function headerNotes({ time, timeConfidence }: CastTable): Understood[] {
  if (time === null || timeConfidence === "stated in the file") return [];
  const taken = "of the instrument or its computer, taken for UTC";
  return [{ what: "Clock", taken, confidence: timeConfidence }];
}

function columnNote({ channel, name, unit, confidence, unitConfidence }: CastColumn): Understood {
  const sure = confidence === "by name" ? unitConfidence : confidence;
  return { what: channel, taken: channel === "salinity" ? `“${name}”` : `“${name}” in ${unit.id}`, confidence: sure };
}

function orderOf(half: "down" | "up", { downStart, turn }: CastHalves, length: number): number[] {
  return half === "down"
    ? Array.from({ length: turn - downStart + 1 }, (_, k) => downStart + k)
    : Array.from({ length: length - turn }, (_, k) => length - 1 - k);
}

function describe(
  values: ReadonlyMap<CastChannel, Float64Array>,
  columns: readonly CastColumn[],
  derived: Partial<Record<CastChannel, string | null>>,
): CastReading["channels"] {
  return Object.fromEntries(
    [...values].map(([channel, list]) => {
      const name = columns.find((column) => column.channel === channel)?.name;
      return [channel, castStatistics(channel, list, name ?? derived[channel] ?? "")];
    }),
  );
}

function halfQuestion(half: "down" | "up", { hasDowncast }: CastHalves, answers: CastAnswers): CastQuestion {
  return {
    key: "half",
    needed: false,
    message: hasDowncast
      ? "The file has the way down and the way up. On the way up the instrument has stirred the water."
      : "The file begins at the bottom: it has the way up alone.",
    options: [
      { value: "down", label: "the way down" },
      { value: "up", label: "the way up" },
    ],
    suggestion: half,
    ...(answers.half && { answer: answers.half }),
  };
}
