import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { StormRefusal } from "~/storms/refusal";
import { isPresent, type SamplePlace } from "./find-samples";
import { loadQuality, type LoadedQuality } from "./load-quality.server";
import { stillStanding } from "./override-acts";
import type { SetFlag } from "./overrides";

/** What one act may set; beyond, a threshold or another record is the better answer. Common practice, no source. */
export const MOST_SET_AT_ONCE = 5000;

export interface FlagAct {
  /** Chooses among the storm's samples as they are now. */
  choose: (quality: LoadedQuality) => SamplePlace[];
  flag: SetFlag;
  reason: string;
  by: string;
}

/**
 * Sets the flag of samples in place of what the tests say. What stood before stays on record.
 * @returns how many were set
 * @throws StormRefusal where none is chosen, or too many
 */
export async function setFlags(tenant: Tenant, storm: Storm, { choose, flag, reason, by }: FlagAct): Promise<number> {
  return tenant.write(async (inner) => {
    const quality = await loadQuality(inner, storm);
    const chosen = choose(quality).filter(isPresent);
    if (chosen.length === 0) {
      throw new StormRefusal("Tick the samples in the table first; a missing one has no value to judge.", "samples");
    }
    if (chosen.length > MOST_SET_AT_ONCE) {
      throw new StormRefusal(
        `That is ${chosen.length} samples; at most ${MOST_SET_AT_ONCE} are set at once. Narrow the filter, or change the thresholds.`,
        "samples",
      );
    }
    const createdAt = after(quality);
    await inner.flagOverrides.createAll(
      chosen.map(({ judged: { recordId, channel, time, values }, k }) => ({
        recordId,
        channel,
        at: time[k],
        value: values[k],
        flag,
        reason,
        createdBy: by,
        createdAt,
      })),
    );
    return chosen.length;
  });
}

/**
 * Gives the samples of an act back to the tests, as far as that act is the last word on them. The act stays on record.
 * @throws StormRefusal where it no longer stands anywhere
 */
export async function takeBackAct(
  tenant: Tenant,
  storm: Storm,
  { key, by }: { key: string; by: string },
): Promise<void> {
  await tenant.write(async (inner) => {
    const quality = await loadQuality(inner, storm);
    const own = stillStanding(quality.inputs.overrides, key);
    if (own.length === 0) throw new StormRefusal("These flags no longer stand: they were taken back or set anew.");
    const createdAt = after(quality);
    await inner.flagOverrides.createAll(
      own.map(({ recordId, channel, at, value }) => ({
        recordId,
        channel,
        at,
        value,
        flag: null,
        reason: "Taken back.",
        createdBy: by,
        createdAt,
      })),
    );
  });
}

/** Now, but later than all there is: the order of overrides is what decides between them. */
function after({ inputs }: LoadedQuality): Date {
  return new Date(Math.max(Date.now(), (inputs.overrides.at(-1)?.createdAt.getTime() ?? 0) + 1));
}
