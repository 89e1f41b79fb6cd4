/** What a memo is issued for; printed on every page. */
export const MEMO_PURPOSES = [
  "information",
  "comment",
  "client decision",
  "permit submission",
  "construction or operations",
  "evidence",
] as const;
export type MemoPurpose = (typeof MEMO_PURPOSES)[number];
