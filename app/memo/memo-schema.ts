import { z } from "zod";
import { MEMO_PURPOSES } from "./purposes";

export const memoSchema = z.object({
  title: z.string("Write a title.").trim().min(1, "Write a title.").max(160, "Use at most 160 characters."),
  question: z
    .string("Write the client's question.")
    .trim()
    .min(1, "Write the client's question: the memo answers it first.")
    .max(2000, "Use at most 2000 characters."),
  findings: z.string().trim().max(8000, "Use at most 8000 characters.").default(""),
  purpose: z.enum(MEMO_PURPOSES, "Choose what the memo is issued for."),
  estimates: z
    .array(z.string())
    .min(1, "Choose at least one estimate: a memo without a response says nothing.")
    .max(12, "A memo takes at most twelve estimates."),
});

export type MemoValues = z.output<typeof memoSchema>;
