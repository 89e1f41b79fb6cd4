/** Every number within a value, with the way to it. */
export function everyNumber(value: unknown, path = ""): [path: string, value: number][] {
  if (typeof value === "number") return [[path, value]];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, item]) => everyNumber(item, path ? `${path}.${key}` : key));
}
