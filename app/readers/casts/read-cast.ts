import { depthFromPressure } from "~/ocean/seawater/depth-from-pressure";
import { salinityFromConductivity } from "~/ocean/seawater/practical-salinity";
import { pressureFromDepth } from "~/ocean/seawater/pressure-from-depth";
import { ProblemList } from "../problem-list";
import { UnreadableFile, type Understood } from "../reading";
import { exactSum } from "../series-statistics";
import { openText, type SourceFile } from "../source-file";
import { castColumns, type CastColumn } from "./cast-columns";
import { castHalves, monotone } from "./cast-halves";
import {
  CAST_CHANNELS,
  type CastAnswers,
  type CastChannel,
  type CastChannelReading,
  type CastQuestion,
  type CastReading,
  type CastSample,
} from "./cast-reading";
import type { CastTable } from "./cast-table";
import { exchangeTable, isExchangeCast } from "./exchange-cast";
import { instrumentTable, isInstrumentCast } from "./instrument-cast";
import { isPlainCast, plainTable } from "./plain-cast";

interface CastForm {
  id: string;
  label: string;
  recognises: (source: SourceFile) => boolean;
  table: (source: SourceFile, problems: ProblemList) => CastTable | null;
}

const FORMS: readonly CastForm[] = [
  { id: "castExchange", label: "exchange file of one cast", recognises: isExchangeCast, table: exchangeTable },
  { id: "castInstrument", label: "instrument's ASCII file", recognises: isInstrumentCast, table: instrumentTable },
  { id: "castPlain", label: "delimited cast", recognises: () => true, table: plainTable },
];

/** Whether a text is unmistakably a cast: a form of its own, or a table of salt and heat by depth without a time. */
export function isCastText(source: SourceFile): boolean {
  return isExchangeCast(source) || isInstrumentCast(source) || isPlainCast(source);
}

/** Latitude for depth where the file tells none, degrees: the pole and the equator differ from it by 0.3 %. */
const ASSUMED_LATITUDE = 45;

/**
 * Reads a cast: temperature and salinity down the water, whatever the file measures depth and salt by.
 * @param input.answers the same bytes, name and answers give the same reading
 * @returns samples of one half, from the surface down, depth in m, temperature in situ (ITS-90)
 * @throws UnreadableFile where nothing can be read; its `problems` say why and what to do
 */
export function readCast(input: { bytes: Uint8Array; fileName: string; answers?: CastAnswers }): CastReading {
  const { bytes, fileName, answers = {} } = input;
  const problems = new ProblemList();
  const refuse = (code: string, what: string, toDo: string): never => {
    problems.add("error", code, what, toDo);
    throw new UnreadableFile(problems.toArray());
  };
  const source = openText(bytes, fileName, problems);
  if (!source) throw new UnreadableFile(problems.toArray());
  const form = FORMS.find(({ recognises }) => recognises(source)) ?? FORMS[FORMS.length - 1];
  const table = form.table(source, problems);
  if (!table) {
    return refuse(
      "noCast",
      `“${fileName}” has no line of column names with a depth or pressure and a temperature`,
      "Name the columns, as `depth (m),temperature (°C),salinity`.",
    );
  }
  const columns = castColumns(table.names, table.units);
  const values = new Map(columns.map((column) => [column.channel, valuesOf(table, column, problems)]));
  if (table.rows.length === 0)
    return refuse("onlyHeader", `“${fileName}” has names but no records`, "Give the whole file.");
  const temperature = values.get("temperature");
  if (!temperature || !(values.has("pressure") || values.has("depth"))) {
    return refuse(
      "noCast",
      `“${fileName}” has no ${temperature ? "depth or pressure" : "temperature"}; columns seen: ${table.names.join(", ").slice(0, 300)}`,
      "Give a cast with depth or pressure, temperature, and salinity or conductivity.",
    );
  }
  const understood: Understood[] = [
    { what: "Format", taken: form.label, confidence: "by content" },
    ...columns.map((column): Understood => {
      const confidence = column.stated ? "stated in the file" : "assumed";
      return { what: column.channel, taken: `“${column.name}” in ${column.unit}`, confidence };
    }),
  ];
  const questions: CastQuestion[] = [];
  if (answers.temperatureScale === "IPTS-68") {
    temperature.forEach((t68, k) => (temperature[k] = t68 / 1.00024));
    understood.push({ what: "Temperature scale", taken: "IPTS-68, turned to ITS-90", confidence: "answered" });
  }
  const told = table.latitude !== null && Math.abs(table.latitude) <= 90 ? table.latitude : null;
  const latitude = answers.latitude ?? told ?? ASSUMED_LATITUDE;
  const { pressure, depth } = depths(values, latitude);
  if (!values.has("depth") && told === null) questions.push(latitudeQuestion(answers));
  const salt = saltOf(values, temperature, pressure, answers, columns);
  if (salt.note) understood.push(salt.note);
  if (salt.question) questions.push(salt.question);
  const halves = castHalves(pressure);
  const half = answers.half ?? "down";
  if (halves.hasUpcast) questions.push(halfQuestion(half, answers));
  const order =
    half === "down" ? range(halves.downStart, halves.turn) : range(halves.turn, pressure.length - 1).reverse();
  const samples = samplesOf(monotone(order, pressure), { pressure, depth, temperature, salinity: salt.values });
  if (halves.downStart > 0 && half === "down") {
    understood.push({
      what: "Soak at the surface",
      taken: `the first ${halves.downStart} records are left out`,
      confidence: "by content",
    });
  }
  if (salt.values === null) {
    problems.add(
      "error",
      "noSalinity",
      "the cast has neither salinity nor conductivity",
      "Give a cast with one of the two.",
    );
  } else if (samples.length < 2) {
    problems.add("error", "tooShort", "fewer than two depths can be used", "Give a cast of the whole water.");
  }
  const channels = describe(values, pressure, depth, salt);
  return {
    kind: "cast",
    format: form.id,
    formatLabel: form.label,
    fileName,
    rows: table.rows.length,
    time: table.time,
    latitude: told,
    longitude: table.longitude,
    channels: channels(columns),
    salinityScale: salt.scale,
    samples,
    half,
    understood,
    questions,
    problems: problems.toArray(),
    leftOut: table.names.filter((_, index) => !columns.some((column) => column.index === index)),
  };
}

function valuesOf(table: CastTable, column: CastColumn, problems: ProblemList): Float64Array {
  const flag = table.flagOf.get(column.index);
  return Float64Array.from(table.rows, (cells, k) => {
    const text = cells[column.index]?.trim() ?? "";
    const value = text === "" || /^nan$/i.test(text) ? NaN : Number(text);
    const missing =
      Number.isNaN(value) || table.missing.some((code) => Math.abs(value - code) <= 1e-9 * Math.abs(code));
    if (text !== "" && Number.isNaN(value) && !/^(?:nan|na|n\/a|-)$/i.test(text)) {
      problems.add("error", "unreadableNumber", `“${text.slice(0, 30)}” is no number`, "Correct it in the file.", {
        row: table.lines[k] ?? 0,
        column: column.name,
      });
    }
    if (missing) return NaN;
    if (flag !== undefined && table.badFlags.includes(cells[flag]?.trim() ?? "")) {
      problems.add("note", "flaggedBad", "values that the file flags as bad", "They were left out.", {
        row: table.lines[k] ?? 0,
        column: column.name,
      });
      return NaN;
    }
    return (value - column.zero) * column.factor;
  });
}

/** Pressure and depth, each from the other where the file has one alone. In the air both are 0. */
function depths(values: ReadonlyMap<CastChannel, Float64Array>, latitude: number) {
  const [pressure, depth] = [values.get("pressure"), values.get("depth")];
  const wet = (value: number) => Math.max(0, value);
  return {
    pressure:
      pressure ??
      (depth ?? new Float64Array()).map((d) => (Number.isNaN(d) ? NaN : pressureFromDepth(wet(d), latitude))),
    depth:
      depth ??
      (pressure ?? new Float64Array()).map((p) => (Number.isNaN(p) ? NaN : depthFromPressure(wet(p), latitude))),
  };
}

interface Salt {
  /** Null where the file has neither salinity nor conductivity. */
  values: Float64Array | null;
  scale: "practical" | "absolute";
  from: string;
  note: Understood | null;
  question: CastQuestion | null;
}

function saltOf(
  values: ReadonlyMap<CastChannel, Float64Array>,
  temperature: Float64Array,
  pressure: Float64Array,
  answers: CastAnswers,
  columns: readonly CastColumn[],
): Salt {
  const given = values.get("salinity");
  const conductivity = values.get("conductivity");
  if (given) {
    const name = columns.find(({ channel }) => channel === "salinity")?.name ?? "salinity";
    const absolute = /absolute|^sa$/i.test(name);
    const scale = answers.salinityScale ?? (absolute ? "absolute" : "practical");
    return {
      values: given,
      scale,
      from: name,
      note: null,
      question: {
        key: "salinityScale",
        needed: false,
        message: "Is the salinity Practical (PSS-78) or Absolute (g/kg)?",
        options: [
          { value: "practical", label: "Practical Salinity" },
          { value: "absolute", label: "Absolute Salinity, g/kg" },
        ],
        suggestion: scale,
        ...(answers.salinityScale && { answer: answers.salinityScale }),
      },
    };
  }
  if (!conductivity) return { values: null, scale: "practical", from: "", note: null, question: null };
  return {
    values: conductivity.map((C, k) =>
      C > 0 && Number.isFinite(temperature[k]) && Number.isFinite(pressure[k])
        ? salinityFromConductivity(C, temperature[k], Math.max(0, pressure[k]))
        : NaN,
    ),
    scale: "practical",
    from: "conductivity, by PSS-78",
    note: {
      what: "salinity",
      taken: "from conductivity, by the Practical Salinity Scale of 1978",
      confidence: "by content",
    },
    question: null,
  };
}

function range(from: number, to: number): number[] {
  return Array.from({ length: Math.max(0, to - from + 1) }, (_, k) => from + k);
}

interface Profiles {
  pressure: Float64Array;
  depth: Float64Array;
  temperature: Float64Array;
  salinity: Float64Array | null;
}

function samplesOf(order: readonly number[], { pressure, depth, temperature, salinity }: Profiles): CastSample[] {
  return order.flatMap((k) => {
    const sample = {
      depth: Math.max(0, depth[k]),
      pressure: Math.max(0, pressure[k]),
      temperature: temperature[k],
      salinity: salinity?.[k] ?? NaN,
    };
    return Object.values(sample).every(Number.isFinite) ? [sample] : [];
  });
}

function describe(
  values: ReadonlyMap<CastChannel, Float64Array>,
  pressure: Float64Array,
  depth: Float64Array,
  salt: Salt,
): (columns: readonly CastColumn[]) => CastReading["channels"] {
  const all = new Map<CastChannel, Float64Array>([...values, ["pressure", pressure], ["depth", depth]]);
  if (salt.values) all.set("salinity", salt.values);
  const derived: Partial<Record<CastChannel, string>> = {
    pressure: "depth, after Saunders (1981)",
    depth: "pressure, after Saunders (1981)",
    salinity: salt.from,
  };
  return (columns) =>
    Object.fromEntries(
      [...all].map(([channel, list]): [CastChannel, CastChannelReading] => {
        const name = columns.find((column) => column.channel === channel)?.name;
        return [channel, statisticsOf(channel, list, name ?? derived[channel] ?? "")];
      }),
    );
}

function statisticsOf(channel: CastChannel, values: Float64Array, from: string): CastChannelReading {
  const present = values.filter((value) => !Number.isNaN(value));
  const some = present.length > 0;
  return {
    unit: CAST_CHANNELS[channel],
    values,
    count: present.length,
    missing: values.length - present.length,
    mean: some ? exactSum(present) / present.length : null,
    min: some ? present.reduce((least, value) => Math.min(least, value), Infinity) : null,
    max: some ? present.reduce((most, value) => Math.max(most, value), -Infinity) : null,
    from,
  };
}

function latitudeQuestion({ latitude }: CastAnswers): CastQuestion {
  return {
    key: "latitude",
    needed: false,
    message: `At which latitude was it taken? Depth follows from pressure by it; without one, ${ASSUMED_LATITUDE}° is assumed, within 0.3 %.`,
    suggestion: String(ASSUMED_LATITUDE),
    ...(latitude !== undefined && { answer: String(latitude) }),
  };
}

function halfQuestion(half: "down" | "up", answers: CastAnswers): CastQuestion {
  return {
    key: "half",
    needed: false,
    message: "The file has the way down and the way up. Which is taken? On the way up the water has been stirred.",
    options: [
      { value: "down", label: "the way down" },
      { value: "up", label: "the way up" },
    ],
    suggestion: half,
    ...(answers.half && { answer: answers.half }),
  };
}
