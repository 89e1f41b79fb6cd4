const double = new DataView(new ArrayBuffer(8));

/** Any value as text, every number as the 64 bits that it is: tells 0 from -0, and one last bit from the next. */
export function bitText(value: unknown): string {
  if (typeof value === "number") return bitsOf(value).toString(16).padStart(16, "0");
  if (Array.isArray(value)) return `[${value.map(bitText).join(",")}]`;
  if (typeof value !== "object" || value === null) return JSON.stringify(value) ?? "absent";
  const members = Object.entries(value).map(([key, member]) => `${key}:${bitText(member)}`);
  return `{${members.sort().join(",")}}`;
}

export function bitsOf(value: number): bigint {
  double.setFloat64(0, value);
  return double.getBigUint64(0);
}

/** How many doubles lie between two; beyond any count where one of them is no number or has another sign. */
export function ulpsBetween(a: bigint, b: bigint): number {
  return Number(a > b ? a - b : b - a);
}
