import { canonicalJson } from "~/ocean/canonical-json";
import type { Tenant } from "~/db/scoped.server";
import { StormRefusal } from "~/storms/refusal";
import { defaultChannelThresholds, defaultRelations } from "./default-thresholds";
import { projectThresholds } from "./quality-inputs.server";
import type { ChosenThresholds } from "./thresholds";
import { postedChannelThresholds, postedRelations, type ThresholdPart } from "./thresholds-form";

interface ThresholdChange {
  part: ThresholdPart;
  /** Null: back to the defaults. */
  form: FormData | null;
  /** The version that the person saw. */
  seen: number;
  by: string;
}

/**
 * Keeps the thresholds of one part as the project's next version; what equals the defaults is not kept apart.
 * @throws StormRefusal where the form is wrong, nothing is changed, or another person saved meanwhile
 */
export async function saveThresholds(
  tenant: Tenant,
  projectId: string,
  { part, form, seen, by }: ThresholdChange,
): Promise<void> {
  await tenant.write(async (inner) => {
    const { chosen, version } = await projectThresholds(inner, projectId);
    const next = changed(chosen ?? { channels: {} }, part, form);
    if (version !== seen) {
      throw new StormRefusal(
        `Someone saved version ${version} of the thresholds meanwhile. What you wrote is still here: look at theirs in another window, then save again.`,
      );
    }
    if (canonicalJson(next) === canonicalJson(chosen ?? { channels: {} })) {
      throw new StormRefusal("Nothing is changed: these are the thresholds in force already.");
    }
    await inner.thresholdSheets.create({ projectId, version: version + 1, thresholds: next, createdBy: by });
  });
}

function changed(chosen: ChosenThresholds, part: ThresholdPart, form: FormData | null): ChosenThresholds {
  if (part === "relations") {
    const relations = form && unlessDefault(postedRelations(form), defaultRelations());
    return { channels: chosen.channels, ...(relations && { relations }) };
  }
  const limits = form && unlessDefault(postedChannelThresholds(form), defaultChannelThresholds(part));
  const channels = { ...chosen.channels };
  delete channels[part];
  return { ...chosen, channels: limits ? { ...channels, [part]: limits } : channels };
}

function unlessDefault<T>(values: T, defaults: T): T | null {
  return canonicalJson(values) === canonicalJson(defaults) ? null : values;
}
