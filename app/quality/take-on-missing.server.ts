/** What a person decides on a storm's missing and suspect values. */
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { StormRefusal } from "~/storms/refusal";
import { loadQuality } from "./load-quality.server";
import { MISSING_REFUSED } from "./missing-rule";
import { greatestMissing } from "./summarise-quality";

/**
 * Takes it on to estimate although more is missing than the rule allows, up to the share that is missing now.
 * @throws StormRefusal where the rule allows what is there
 */
export async function takeOnMissing(
  tenant: Tenant,
  storm: Storm,
  { reason, by, at }: { reason: string; by: string; at: string },
): Promise<void> {
  await tenant.write(async (inner) => {
    const { judged, window } = await loadQuality(inner, storm);
    const upTo = window ? greatestMissing(judged, { window, leaveOutSuspect: storm.leaveOutSuspect }) : 0;
    if (upTo <= MISSING_REFUSED) {
      throw new StormRefusal("No more is missing than the rule allows, so there is nothing to take on.");
    }
    await inner.storms.update(storm.id, { missingAccepted: { by, at, reason, upTo } });
  });
}

export async function withdrawMissing(tenant: Tenant, storm: Storm): Promise<void> {
  await tenant.storms.update(storm.id, { missingAccepted: null });
}

export async function chooseSuspect(tenant: Tenant, storm: Storm, leaveOutSuspect: boolean): Promise<void> {
  await tenant.storms.update(storm.id, { leaveOutSuspect });
}
