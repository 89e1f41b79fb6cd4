import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { standing } from "~/quality/overrides";
import { formatNumber } from "~/units/format-quantity";
import { QUANTITIES } from "~/units/quantities";
import type { ChannelSeries } from "./channel-series";
import { loadSeries, storeSeries } from "./load-series.server";
import { StormRefusal } from "./refusal";
import { changeRecord, changeSeries, factorOf, scenarioWords, type ScenarioChanges } from "./scenario";
import { freeName, STORM_NAME_LENGTH } from "./storm-name";
import { windowOf } from "./storm-window";

export interface ScenarioRequest {
  /** Empty: the storm's own, with what is changed. */
  name: string;
  changes: ScenarioChanges;
  requestedBy: string;
}

/**
 * Copies a storm with its wind or rain scaled or its times moved: a storm of its own, with the same originals behind it.
 * @throws StormRefusal where there is nothing to copy yet, the name is taken, or a value would leave what a sea can meet
 */
export async function copyAsScenario(tenant: Tenant, storm: Storm, request: ScenarioRequest): Promise<Storm> {
  const { changes, requestedBy } = request;
  if (storm.track) {
    throw new StormRefusal("The wind of this storm comes from its track: change the track or its parameters instead.");
  }
  const window = windowOf(storm);
  if (!window) throw new StormRefusal("The storm has no window yet: confirm a record with wind first.");
  return tenant.write(async (inner) => {
    const series = await loadSeries(inner, storm.id);
    for (const entry of series) refuseBeyond(entry, changes);
    const storms = await inner.storms.list({ where: { projectId: storm.projectId } });
    const taken = new Set(storms.map(({ name }) => name));
    if (taken.has(request.name)) {
      throw new StormRefusal(`Another storm of this project is named "${request.name}".`, "scenarioName");
    }
    const shift = changes.shiftHours * 3600;
    const copy = await inner.storms.create({
      projectId: storm.projectId,
      name: request.name || freeName(`${storm.name}, ${scenarioWords(changes)}`.slice(0, STORM_NAME_LENGTH), taken),
      startsAt: window.startsAt + shift,
      endsAt: window.endsAt + shift,
      leaveOutSuspect: storm.leaveOutSuspect,
      missingAccepted: storm.missingAccepted,
    });
    const records = await inner.records.list({ where: { stormId: storm.id }, order: [["createdAt", "ASC"]] });
    for (const record of records) {
      const inUse = series.filter(({ recordId }) => recordId === record.id);
      const { sourceFileId, origin, answers, provenance } = record;
      if (inUse.length === 0 || !provenance) continue;
      const changed = changeRecord({ name: record.name, provenance }, { ...changes, of: storm.name });
      const { id } = await inner.records.create({
        stormId: copy.id,
        sourceFileId,
        origin,
        answers,
        state: "confirmed",
        ...changed,
        createdBy: requestedBy,
      });
      for (const entry of inUse) {
        await storeSeries(inner, { stormId: copy.id, recordId: id }, changeSeries(entry, changes));
      }
      await copyOverrides(inner, { from: record.id, to: id }, changes);
    }
    return copy;
  });
}

/** What persons set stands in the scenario too, on the changed values, with who set it, when and why. */
async function copyOverrides(
  tenant: Tenant,
  { from, to }: { from: string; to: string },
  changes: ScenarioChanges,
): Promise<void> {
  const overrides = await tenant.flagOverrides.list({
    where: { recordId: from },
    order: [
      ["createdAt", "ASC"],
      ["id", "ASC"],
    ],
  });
  const kept = [...standing(overrides).values()].filter(({ flag }) => flag !== null);
  await tenant.flagOverrides.createAll(
    kept.map(({ channel, at, value, flag, reason, createdBy, createdAt }) => ({
      recordId: to,
      channel,
      at: at + changes.shiftHours * 3600,
      value: value * factorOf(channel, changes),
      flag,
      reason,
      createdBy,
      createdAt,
    })),
  );
}

const FACTORS = { windSpeed: "windFactor", windGust: "windFactor", rain: "rainFactor" } as const;
const LIMITS = {
  windSpeed: QUANTITIES.windSpeed,
  windGust: QUANTITIES.windGust,
  rain: QUANTITIES.rainRate,
} as const;

function refuseBeyond({ channel, values, unit }: ChannelSeries, changes: ScenarioChanges): void {
  if (channel !== "windSpeed" && channel !== "windGust" && channel !== "rain") return;
  const peak = values.reduce((highest, value) => Math.max(highest, value), 0);
  const { name, limits } = LIMITS[channel];
  if (peak * factorOf(channel, changes) <= limits.max) return;
  throw new StormRefusal(
    `The highest ${name} of ${formatNumber(peak, 1)} ${unit} would pass ${limits.max} ${unit}: write ${formatNumber(Math.floor((limits.max / peak) * 100) / 100, 2)} or less.`,
    FACTORS[channel],
  );
}

/**
 * A scenario stays what its storm was, changed as it says.
 * @throws StormRefusal in a storm that is one
 */
export async function refuseInScenario(tenant: Tenant, stormId: string): Promise<void> {
  const records = await tenant.records.list({ where: { stormId } });
  if (records.some(({ provenance }) => provenance?.scenario)) {
    throw new StormRefusal(
      "A scenario keeps the records of the storm it was copied from. Change that storm, then copy it anew.",
    );
  }
}
