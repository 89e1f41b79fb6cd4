import { measureBox } from "~/area/measure-box";
import type { FlagOverride } from "~/db/models/flag-override.server";
import type { StormRecord } from "~/db/models/record.server";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import type { ChannelName } from "~/readers/reading";
import type { StormSeries } from "~/storms/load-series.server";
import { thresholdsInForce } from "./default-thresholds";
import { judgeStorm, type JudgedChannel } from "./judge-storm";
import type { Thresholds } from "./thresholds";
import { chosenThresholdsSchema } from "./thresholds-schema";

/** What the flags of a storm are made from, beside its series. */
export interface QualityInputs {
  thresholds: Thresholds;
  /** 0: the defaults. */
  thresholdsVersion: number;
  /** Oldest first. */
  overrides: FlagOverride[];
  /** [longitude, latitude] of the first study box, degrees. */
  place: readonly [number, number] | null;
  /** Records that a person set to one value. */
  constantRecords: ReadonlySet<string>;
}

const OLDEST_FIRST: [string, string][] = [
  ["createdAt", "ASC"],
  ["id", "ASC"],
];

/** The thresholds of a project: its last version, else the defaults as version 0. */
export async function projectThresholds(tenant: Tenant, projectId: string) {
  const sheet = await tenant.thresholdSheets.first({ where: { projectId }, order: [["version", "DESC"]] });
  const chosen = sheet && chosenThresholdsSchema.parse(sheet.thresholds);
  return { chosen, version: sheet?.version ?? 0, thresholds: thresholdsInForce(chosen), sheet };
}

export async function qualityInputs(
  tenant: Tenant,
  storm: Pick<Storm, "projectId">,
  records: readonly Pick<StormRecord, "id" | "origin">[],
): Promise<QualityInputs> {
  const [{ thresholds, version }, overrides, box] = await Promise.all([
    projectThresholds(tenant, storm.projectId),
    tenant.flagOverrides.list({ where: { recordId: records.map(({ id }) => id) }, order: OLDEST_FIRST }),
    tenant.studyBoxes.first({ where: { projectId: storm.projectId }, order: OLDEST_FIRST }),
  ]);
  return {
    thresholds,
    thresholdsVersion: version,
    overrides,
    place: box && measureBox(box.polygon).centroid,
    constantRecords: new Set(records.filter(({ origin }) => origin === "constant").map(({ id }) => id)),
  };
}

export function judgeSeries(series: readonly StormSeries[], inputs: QualityInputs): JudgedChannel[] {
  const constants = new Set<ChannelName>(
    series.filter(({ recordId }) => inputs.constantRecords.has(recordId)).map(({ channel }) => channel),
  );
  const { thresholds, overrides, place } = inputs;
  return judgeStorm({ series, thresholds, overrides, place, constants });
}
