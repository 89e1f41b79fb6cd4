import { OceanError } from "~/ocean/errors";

/** The inputs of one case, read with the engine's own refusals: a missing or wrong one is INVALID_INPUT. */
export class CaseInputs {
  private readonly values: Readonly<Record<string, unknown>>;

  constructor(values: Readonly<Record<string, unknown>>) {
    this.values = values;
  }

  has(name: string): boolean {
    return this.values[name] !== undefined && this.values[name] !== null;
  }

  number(name: string, otherwise?: number): number {
    const value = this.values[name];
    if (value === undefined && otherwise !== undefined) return otherwise;
    return asNumber(name, value);
  }

  /** A number, or null where the case says null or nothing. */
  numberOrNull(name: string): number | null {
    return this.has(name) ? this.number(name) : null;
  }

  text(name: string, otherwise?: string): string {
    const value = this.values[name] ?? otherwise;
    if (typeof value !== "string") throw new OceanError("INVALID_INPUT", `${name} must be text.`);
    return value;
  }

  flag(name: string, otherwise: boolean): boolean {
    const value = this.values[name] ?? otherwise;
    if (typeof value === "boolean") return value;
    return this.number(name) !== 0;
  }

  numbers(name: string): number[] {
    const value = this.values[name];
    if (!Array.isArray(value)) throw new OceanError("INVALID_INPUT", `${name} must be a list of numbers.`);
    return value.map((item, k) => asNumber(`${name}[${k}]`, item));
  }

  group(name: string): CaseInputs {
    const value = this.values[name];
    if (typeof value !== "object" || value === null)
      throw new OceanError("INVALID_INPUT", `${name} must be an object.`);
    return new CaseInputs(value as Record<string, unknown>);
  }
}

/** JSON has no word for what is no number; check files write it as text. */
function asNumber(name: string, value: unknown): number {
  if (typeof value === "number") return value;
  if (value === "NaN") return Number.NaN;
  if (value === "Infinity") return Number.POSITIVE_INFINITY;
  if (value === "-Infinity") return Number.NEGATIVE_INFINITY;
  throw new OceanError("INVALID_INPUT", `${name} must be a number; it is ${JSON.stringify(value) ?? "missing"}.`);
}
