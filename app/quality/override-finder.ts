import type { SamplePlace } from "./find-samples";
import type { RecordOverride } from "./judge-storm";
import { sampleKey, standing } from "./overrides";

/**
 * Finds the override that stands on a sample and holds for its value; null where there is none.
 * @param overrides oldest first
 */
export function overrideFinder<O extends RecordOverride>(overrides: readonly O[]) {
  const byRecord = new Map<string, ReadonlyMap<string, O>>();
  for (const { recordId } of overrides) {
    if (!byRecord.has(recordId))
      byRecord.set(recordId, standing(overrides.filter((each) => each.recordId === recordId)));
  }
  return ({ judged: { recordId, channel, time, values }, k }: SamplePlace): O | null => {
    const override = byRecord.get(recordId)?.get(sampleKey(channel, time[k]));
    return override && override.flag !== null && override.value === values[k] ? override : null;
  };
}
