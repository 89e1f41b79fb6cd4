/** Collects from the database what an estimate stands on. */
import { buildScenario } from "./build-scenario";
import { inputParts, type InputParts } from "./input-parts";
import type { InputsRegister } from "./inputs-register";
import { readStorm, type StormReading } from "./read-storm.server";
import { readWater, type WaterReading } from "./read-water.server";
import { Recent } from "./recent";
import type { StormForcing } from "./storm-forcing";
import { measureBox } from "~/area/measure-box";
import type { MethodSheet } from "~/db/models/method-sheet.server";
import type { Storm } from "~/db/models/storm.server";
import type { StudyBox } from "~/db/models/study-box.server";
import type { Tenant } from "~/db/scoped.server";
import { inputHash } from "~/ocean/input-hash";
import type { Position, Scenario, ScenarioProblem } from "~/ocean/scenario";

export interface GatheredScenario {
  /** Null where the storm's series leave nothing to compute with: `problems` says why. */
  scenario: Scenario | null;
  /** The engine's hash of `scenario`; null where a problem stands in the way of a run, so that no response answers to it. */
  hash: string | null;
  parts: InputParts | null;
  forcing: StormForcing | null;
  /** What stands in the way of a run; more may come from the engine. */
  problems: ScenarioProblem[];
  assumptions: string[];
  register: InputsRegister;
}

export interface EstimateRows {
  box: StudyBox;
  storm: Storm;
  water: WaterReading;
  sheet: MethodSheet;
}

/** Parts to hash of the whole: a ledger asks for the same again and again. */
const recentHashes = new Recent<string>(2048);

function hashOf(scenario: Scenario, parts: InputParts): string {
  const key = Object.values(parts).join(" ");
  const hash = recentHashes.get(key) ?? inputHash(scenario);
  recentHashes.set(key, hash);
  return hash;
}

/** Where a track's wind is computed for a box. */
export function middleOf({ polygon }: Pick<StudyBox, "polygon">): Position {
  return measureBox(polygon).centroid;
}

export function heatInterpolationOf(sheet: MethodSheet): "linear" | "hold" {
  return sheet.choices.heatInterpolation ?? "linear";
}

/** Puts rows and a storm's reading together; asks the database nothing. */
export function gatherFrom({ box, storm, water, sheet }: EstimateRows, reading: StormReading): GatheredScenario {
  const { forcing, problems, assumptions, scenarioStorm, hash: stormHash, records, quality } = reading;
  const { choices, ensemble } = sheet;
  const { scenarioWater, registered } = water;
  const scenario =
    scenarioStorm && buildScenario({ box, storm: scenarioStorm, water: scenarioWater, method: choices, ensemble });
  const parts = scenario && stormHash ? inputParts(scenario, { storm: stormHash, water: water.hash }) : null;
  const { polygon, waterDepth, shoreNormal, distanceToShore, triggerLevels } = box;
  return {
    scenario,
    hash: scenario && parts && problems.length === 0 ? hashOf(scenario, parts) : null,
    parts,
    forcing,
    problems,
    assumptions,
    register: {
      box: { name: box.name, polygon, waterDepth, shoreNormal, distanceToShore, triggerLevels },
      storm: {
        name: storm.name,
        startsAt: storm.startsAt,
        endsAt: storm.endsAt,
        records,
        quality,
        ...(storm.track && { track: storm.track }),
      },
      water: registered,
      method: { name: sheet.name, version: sheet.version, choices },
    },
  };
}

export interface EstimateReferences {
  studyBoxId: string;
  stormId: string;
  waterColumnId: string;
  methodSheetId: string;
}

/**
 * @param zone names times in messages
 * @returns null where one of the four is no longer there
 */
export async function gatherScenario(
  tenant: Tenant,
  { studyBoxId, stormId, waterColumnId, methodSheetId }: EstimateReferences,
  zone: string,
): Promise<GatheredScenario | null> {
  const [box, storm, water, sheet] = await Promise.all([
    tenant.studyBoxes.find(studyBoxId),
    tenant.storms.find(stormId),
    tenant.waterColumns.find(waterColumnId),
    tenant.methodSheets.find(methodSheetId),
  ]);
  if (!box || !storm || !water || !sheet) return null;
  const read = await readStorm(tenant, storm, heatInterpolationOf(sheet), zone, middleOf(box));
  return gatherFrom({ box, storm, water: await readWater(tenant, water), sheet }, read);
}
