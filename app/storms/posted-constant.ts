import { CONSTANT_KINDS, type ConstantKind } from "./constant-kinds";
import { StormRefusal } from "./refusal";

/**
 * Kind and value of a constant from its form.
 * @throws StormRefusal beside the field that is wrong
 */
export function postedConstant(form: FormData): { kind: ConstantKind; value: number; replace: boolean } {
  const kind = CONSTANT_KINDS.find(({ id }) => id === form.get("kind"));
  if (!kind) throw new StormRefusal("Choose what stays constant, and in which unit.", "kind");
  const field = form.get("value");
  const text = typeof field === "string" ? field.trim().replace(",", ".").replace("\u2212", "-") : "";
  const value = text === "" ? Number.NaN : Number(text);
  if (!(value >= kind.min && value <= kind.max)) {
    throw new StormRefusal(`Write a number from ${kind.min} to ${kind.max} ${kind.unit}.`, "value");
  }
  return { kind, value, replace: form.get("replace") === "on" };
}
