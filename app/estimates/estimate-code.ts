/** `2617-07`: how an estimate is called everywhere, from the project's job number and its own. */
export function estimateCode(jobNumber: string, number: number): string {
  return `${jobNumber}-${String(number).padStart(2, "0")}`;
}

export function sheetLabel({ name, version }: { name: string; version: number }): string {
  return `${name}, version ${version}`;
}
