import type { EstimateOutcome } from "./estimate-outcome";
import { gatherFrom, heatInterpolationOf, middleOf, type GatheredScenario } from "./gather-scenario.server";
import { runInPool } from "./pool.server";
import { readStorm } from "./read-storm.server";
import { readWater } from "./read-water.server";
import { Recent } from "./recent";
import type { Estimate } from "~/db/models/estimate.server";
import type { Tenant } from "~/db/scoped.server";
import { inputHash } from "~/ocean/input-hash";
import type { Headline } from "~/ocean/response";
import type { ScenarioProblem } from "~/ocean/scenario";
import { SUSPECT } from "~/quality/flags";

export type SuspectVariant = { headline: Headline } | { problems: ScenarioProblem[] };

export interface SuspectComparison {
  /** Suspect values in the window, of all channels. */
  suspect: number;
  kept: SuspectVariant;
  leftOut: SuspectVariant;
}

const recent = new Recent<SuspectVariant>(128);

/**
 * An estimate's headline figures with suspect values kept and with them left out, as its inputs are now: nothing is stored,
 * and no ensemble is run.
 * @param zone names times in messages
 * @returns null where one of its four inputs is no longer there
 */
export async function withAndWithoutSuspect(
  tenant: Tenant,
  estimate: Estimate,
  zone: string,
): Promise<SuspectComparison | null> {
  const [box, storm, column, sheet] = await Promise.all([
    tenant.studyBoxes.find(estimate.studyBoxId),
    tenant.storms.find(estimate.stormId),
    tenant.waterColumns.find(estimate.waterColumnId),
    tenant.methodSheets.find(estimate.methodSheetId),
  ]);
  if (!box || !storm || !column || !sheet) return null;
  const water = await readWater(tenant, column);
  const reading = (leaveOut: boolean) =>
    readStorm(tenant, storm, heatInterpolationOf(sheet), zone, middleOf(box), leaveOut);
  const [keeping, leaving] = [await reading(false), await reading(true)];
  const run = (read: typeof keeping) => headlineOf(gatherFrom({ box, storm, water, sheet }, read));
  return {
    suspect: keeping.quality.channels.reduce((sum, { counts }) => sum + counts[SUSPECT], 0),
    kept: await run(keeping),
    leftOut: await run(leaving),
  };
}

async function headlineOf({ scenario, problems }: GatheredScenario): Promise<SuspectVariant> {
  if (!scenario || problems.length > 0) return { problems };
  const plain = { ...scenario, ensemble: undefined };
  const key = inputHash(plain);
  const known = recent.get(key);
  if (known) return known;
  const variant = variantOf(await runInPool(plain));
  recent.set(key, variant);
  return variant;
}

function variantOf(outcome: EstimateOutcome): SuspectVariant {
  return "response" in outcome ? { headline: outcome.response.headline } : outcome;
}
