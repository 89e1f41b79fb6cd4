import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import type { ChannelSeries } from "./channel-series";
import { fillConstants } from "./constant-record.server";
import { loadSeries, type StormSeries } from "./load-series.server";
import { StormRefusal } from "./refusal";
import { trackReach } from "./track-series";
import { fitWindow, proposeWindow, windowLimits, windowOf, windowProblems, type StormWindow } from "./storm-window";

/**
 * Gives a storm its window, and stretches its constants over it. Inside a writing transaction.
 * @throws StormRefusal where the series do not reach that far
 */
export async function setWindow(
  tenant: Tenant,
  storm: Pick<Storm, "id" | "track">,
  series: readonly ChannelSeries[],
  window: StormWindow,
  zone: string,
): Promise<void> {
  const limits = windowLimits([...series, ...trackReach(storm.track)]);
  const [problem] = limits ? windowProblems(window, limits, zone) : [];
  if (problem) throw new StormRefusal(problem.message, problem.field);
  await tenant.storms.update(storm.id, window);
  await fillConstants(tenant, storm.id, window);
}

/** @throws StormRefusal */
export async function changeWindow(tenant: Tenant, storm: Storm, window: StormWindow, zone: string): Promise<void> {
  await tenant.write(async (inner) => setWindow(inner, storm, await loadMeasured(inner, storm.id), window, zone));
}

/** Without constants, which follow the window and cannot bound it. */
export async function loadMeasured(tenant: Tenant, stormId: string): Promise<StormSeries[]> {
  const constants = await tenant.records.list({ where: { stormId, origin: "constant" } });
  const ids = new Set(constants.map(({ id }) => id));
  return (await loadSeries(tenant, stormId)).filter(({ recordId }) => !ids.has(recordId));
}

/** After series have gone: what is left of the window, or what the rest proposes, or none. Inside a writing transaction. */
export async function refitWindow(tenant: Tenant, storm: Storm): Promise<void> {
  const measured = [...(await loadMeasured(tenant, storm.id)), ...trackReach(storm.track)];
  const limits = windowLimits(measured);
  const known = windowOf(storm);
  const window = (known && limits && fitWindow(known, limits)) ?? proposeWindow(measured);
  await tenant.storms.update(storm.id, window ?? { startsAt: null, endsAt: null });
  if (window) await fillConstants(tenant, storm.id, window);
}
