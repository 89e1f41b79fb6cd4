/** The boxes and storms of a project, and for every pair of them what is known. */
import { estimateState, type EstimateState } from "./estimate-state";
import { gatherFrom, heatInterpolationOf, middleOf, type GatheredScenario } from "./gather-scenario.server";
import { readStorm, type StormReading } from "./read-storm.server";
import { readWater } from "./read-water.server";
import { readHeadlines, resultKey, type ResponseWithoutSeries } from "./result-store.server";
import type { Estimate } from "~/db/models/estimate.server";
import type { MethodSheet } from "~/db/models/method-sheet.server";
import type { Project } from "~/db/models/project.server";
import type { Storm } from "~/db/models/storm.server";
import type { StudyBox } from "~/db/models/study-box.server";
import type { WaterColumn } from "~/db/models/water-column.server";
import type { Tenant } from "~/db/scoped.server";
import { ENGINE_VERSION } from "~/ocean/version";

export interface LedgerCell {
  estimate: Estimate;
  state: EstimateState;
  /** For the inputs as they are now where there is one, else of the last run; null before the first. */
  response: ResponseWithoutSeries | null;
}

export interface Ledger {
  boxes: StudyBox[];
  storms: { storm: Storm; reading: StormReading }[];
  columns: WaterColumn[];
  sheets: MethodSheet[];
  cells: LedgerCell[];
}

interface Gathered {
  estimate: Estimate;
  now: GatheredScenario;
}

const BY_AGE: [string, string][] = [
  ["createdAt", "ASC"],
  ["id", "ASC"],
];

/** What an estimate shows, in order: the response to its inputs as they are, else the one of its last run. */
export function resultsOf(estimate: Estimate, hashNow: string | null) {
  const { inputHash, engineVersion } = estimate;
  return [
    ...(hashNow ? [{ inputHash: hashNow, engineVersion: ENGINE_VERSION }] : []),
    ...(inputHash && engineVersion ? [{ inputHash, engineVersion }] : []),
  ];
}

async function cellsOf(tenant: Tenant, gathered: Gathered[]): Promise<LedgerCell[]> {
  const headlines = await readHeadlines(
    tenant,
    gathered.flatMap(({ estimate, now }) => resultsOf(estimate, now.hash)),
  );
  return gathered.map(({ estimate, now }) => {
    const stored = (inputHash: string | null) =>
      inputHash !== null && headlines.has(resultKey({ inputHash, engineVersion: ENGINE_VERSION }));
    const state = estimateState(
      {
        state: estimate.state,
        problems: estimate.problems,
        parts: estimate.inputs?.parts ?? null,
        engineVersion: estimate.engineVersion,
      },
      { parts: now.parts, engineVersion: ENGINE_VERSION, responseStored: stored(now.hash) },
    );
    const shown = resultsOf(estimate, now.hash).find((key) => headlines.has(resultKey(key)));
    return { estimate, state, response: shown ? (headlines.get(resultKey(shown)) ?? null) : null };
  });
}

export async function loadLedger(tenant: Tenant, project: Pick<Project, "id" | "timeZone">): Promise<Ledger> {
  const where = { projectId: project.id };
  const [boxes, stormRows, columns, sheets, estimates] = await Promise.all([
    tenant.studyBoxes.list({ where, order: BY_AGE }),
    tenant.storms.list({ where, order: BY_AGE }),
    tenant.waterColumns.list({ where, order: BY_AGE }),
    tenant.methodSheets.list({ order: BY_AGE }),
    tenant.estimates.list({ where, order: [["number", "ASC"]] }),
  ]);
  const reading = (storm: Storm, interpolation: "linear" | "hold", box: StudyBox | undefined) =>
    readStorm(tenant, storm, interpolation, project.timeZone, storm.track && box ? middleOf(box) : null);
  const storms = await Promise.all(
    stormRows.map(async (storm) => ({ storm, reading: await reading(storm, "linear", boxes[0]) })),
  );
  const waters = await Promise.all(columns.map((column) => readWater(tenant, column)));
  const gathered = await Promise.all(
    estimates.map(async (estimate): Promise<Gathered[]> => {
      const box = boxes.find(({ id }) => id === estimate.studyBoxId);
      const column = storms.find(({ storm }) => storm.id === estimate.stormId);
      const water = waters.find(({ column: { id } }) => id === estimate.waterColumnId);
      const sheet = sheets.find(({ id }) => id === estimate.methodSheetId);
      if (!box || !column || !water || !sheet) return [];
      const interpolation = heatInterpolationOf(sheet);
      const shared = interpolation === "linear" && (!column.storm.track || box === boxes[0]);
      const read = shared ? column.reading : await reading(column.storm, interpolation, box);
      return [{ estimate, now: gatherFrom({ box, storm: column.storm, water, sheet }, read) }];
    }),
  );
  return { boxes, storms, columns, sheets, cells: await cellsOf(tenant, gathered.flat()) };
}
