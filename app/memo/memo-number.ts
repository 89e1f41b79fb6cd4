/** `2617-M2`: the job and the memo's place in it. */
export function memoNumber(jobNumber: string, number: number): string {
  return `${jobNumber}-M${number}`;
}
