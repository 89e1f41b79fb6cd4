import type { ReadingAnswers, ReadingQuestion, ReadingStep, Understood } from "../reading";
import { isValueRole } from "../propose-columns";
import { channelOfRole } from "../settle-columns";
import { flagsOf } from "./cf-flags";
import type { NetcdfFile } from "./netcdf-file";
import type { SampledColumn } from "./settle-amounts";
import type { SettledPlace } from "./settle-place";

export interface Settled {
  understood: Understood[];
  questions: ReadingQuestion[];
  steps: ReadingStep[];
}

/** Leaves out, in place, what the file's own flags call bad, unless it was answered to keep it. */
export function leaveFlaggedOut(
  file: NetcdfFile,
  sampled: readonly SampledColumn[],
  place: SettledPlace,
  answers: ReadingAnswers,
): Settled {
  const settled: Settled = { understood: [], questions: [], steps: [] };
  const keep = answers.flagged === "keep";
  let total = 0;
  for (const { column, values } of sampled) {
    if (!isValueRole(column.role)) continue;
    for (const { variable, isBad, described } of flagsOf(file, column.variable)) {
      const flags = place.storedBeside(column, variable);
      if (flags === null) continue;
      let count = 0;
      for (const [index, flag] of flags.entries()) {
        if (!isBad(flag) || Number.isNaN(values[index])) continue;
        count += 1;
        if (!keep) values[index] = NaN;
      }
      total += count;
      settled.understood.push({
        what: `Flags of “${column.name}”`,
        taken: `“${variable.name}” ${described}: ${count} ${keep ? "kept" : "left out"}`,
        confidence: keep ? "answered" : "stated in the file",
      });
      if (count > 0 && !keep)
        settled.steps.push({
          id: "flagged",
          label: `values of “${column.name}” that “${variable.name}” flags as ${described} left out`,
          channel: channelOfRole(column.role),
          count,
        });
    }
  }
  if (total > 0)
    settled.questions.push({
      key: "flagged",
      needed: false,
      message: `The file flags ${total} of its values as bad. In a storm, what looks bad can be the storm: look at them before they are left out.`,
      options: [
        { value: "leaveOut", label: "Leave them out" },
        { value: "keep", label: "Keep them" },
      ],
      suggestion: "leaveOut",
      ...(answers.flagged === undefined ? {} : { answer: answers.flagged }),
    });
  return settled;
}
