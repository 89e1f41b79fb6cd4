import type { Project } from "~/db/models/project.server";
import type { Tenant } from "~/db/scoped.server";
import { namesOfUsers } from "~/db/unscoped.server";
import { CHANNEL_UNITS } from "~/readers/reading";
import { CHANNELS } from "~/storms/channels";
import { formatTime } from "~/units/format-time";
import { LEFT_PERSON } from "./present-flags";
import { projectThresholds } from "./quality-inputs.server";
import { channelGroups, relationGroups, seasonsText, THRESHOLD_PARTS, type ThresholdPart } from "./thresholds-form";

const labelOf = (part: ThresholdPart) => (part === "relations" ? "between channels" : CHANNELS[part].label);

/** One part of a project's thresholds, as its form shows them. */
export async function presentThresholds(tenant: Tenant, project: Project, part: ThresholdPart) {
  const { chosen, version, thresholds, sheet } = await projectThresholds(tenant, project.id);
  const isChosen = (each: ThresholdPart) =>
    (each === "relations" ? chosen?.relations : chosen?.channels[each]) !== undefined;
  const limits = part === "relations" ? null : thresholds.channels[part];
  const names = await namesOfUsers(sheet ? [sheet.createdBy] : []);
  return {
    part,
    label: labelOf(part),
    version,
    saved: sheet
      ? `Version ${version}, saved by ${names.get(sheet.createdBy) ?? LEFT_PERSON}, ${formatTime(sheet.createdAt, project.timeZone)}.`
      : "All are the defaults.",
    chosen: isChosen(part),
    parts: THRESHOLD_PARTS.map((each) => ({ part: each, label: labelOf(each), chosen: isChosen(each) })),
    groups:
      part === "relations" ? relationGroups(thresholds.relations) : channelGroups(part, thresholds.channels[part]),
    extras:
      part !== "relations" && limits
        ? {
            spikeMethod: limits.spikeMethod,
            seasons: seasonsText(limits),
            unit: CHANNEL_UNITS[part].replace("deg", "°"),
          }
        : null,
  };
}
