import { StormRefusal } from "~/storms/refusal";
import { SET_FLAGS, type SetFlag } from "./overrides";

export const REASON_LENGTH = 500;

/** @throws StormRefusal beside the field */
export function postedReason(form: FormData, field: string): string {
  const written = form.get(field);
  const reason = typeof written === "string" ? written.trim() : "";
  if (reason.length < 3 || reason.length > REASON_LENGTH) {
    throw new StormRefusal(`Write the reason, in 3 to ${REASON_LENGTH} characters: reviewers read it.`, field);
  }
  return reason;
}

/** @throws StormRefusal beside the field */
export function postedFlag(form: FormData): SetFlag {
  const flag = SET_FLAGS.find((known) => String(known) === form.get("setFlag"));
  if (flag === undefined) throw new StormRefusal("Choose good, suspect or bad.", "setFlag");
  return flag;
}
