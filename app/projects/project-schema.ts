import { z } from "zod";

/** IANA zones that this runtime knows; `UTC` first, since it is the usual choice. */
export const TIME_ZONES: readonly string[] = [
  "UTC",
  ...Intl.supportedValuesOf("timeZone").filter((zone) => zone !== "UTC"),
];

const text = (what: string, most: number) =>
  z.string(`Write the ${what}.`).trim().min(1, `Write the ${what}.`).max(most, `Use at most ${most} characters.`);

export const projectFactsSchema = z.object({
  name: text("name of the project", 120),
  jobNumber: text("job number", 40).regex(
    /^[\p{L}\p{N}][\p{L}\p{N} ._/-]*$/u,
    "Use letters, digits, spaces and . _ / - only.",
  ),
  client: text("client's name", 120),
  timeZone: z
    .string("Choose the time zone.")
    .refine(
      (zone) => TIME_ZONES.includes(zone),
      "This is no zone in the list; write for example Europe/Dublin or UTC.",
    ),
});

export const newProjectSchema = projectFactsSchema.extend({
  cautionsAccepted: z.literal("on", "Read the cautions and accept them before the project begins."),
});
