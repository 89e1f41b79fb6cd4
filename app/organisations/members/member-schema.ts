import { z } from "zod";
import { ROLES } from "../permissions";

const standing = {
  role: z.enum(ROLES, "Choose a role."),
  mayCheck: z.boolean().default(false),
  mayIssue: z.boolean().default(false),
};

export const MOST_INVITED_AT_ONCE = 50;

/** Addresses as they are pasted: with commas, semicolons, lines, or names before addresses in angle brackets. */
export function readAddresses(pasted: string): string[] {
  const parts = pasted
    .replace(/"[^"]*"/g, "")
    .split(/[\n,;]+/)
    .map((part) => (/<([^<>]*)>\s*$/.exec(part)?.[1] ?? part).trim().toLowerCase())
    .flatMap((part) => part.split(/\s+/))
    .filter((part) => part !== "");
  return [...new Set(parts)];
}

const address = z.email().max(254);

export const invitationSchema = z.object({
  ...standing,
  addresses: z
    .string("Write at least one e-mail address.")
    .max(20_000, "This is too long. Invite fewer people at once.")
    .transform((pasted, context) => {
      const found = readAddresses(pasted);
      const wrong = found.filter((each) => !address.safeParse(each).success);
      if (wrong.length > 0) {
        const message = `Not an e-mail address: ${wrong.slice(0, 5).join(", ")}${wrong.length > 5 ? " and more" : ""}.`;
        context.addIssue({ code: "custom", message });
      } else if (found.length === 0) {
        context.addIssue({ code: "custom", message: "Write at least one e-mail address." });
      } else if (found.length > MOST_INVITED_AT_ONCE) {
        context.addIssue({ code: "custom", message: `Invite at most ${MOST_INVITED_AT_ONCE} people at once.` });
      }
      return found;
    }),
});

export const standingSchema = z.object(standing);

const version = z.coerce.number().int().positive();

export const memberChangeSchema = z.discriminatedUnion("intent", [
  z.object({ intent: z.literal("change"), version, ...standing }),
  z.object({ intent: z.literal("suspend"), version }),
  z.object({ intent: z.literal("restore"), version }),
  z.object({ intent: z.literal("remove"), version, successor: z.string().optional() }),
  z.object({ intent: z.literal("hand-over"), version }),
]);
export type MemberChangeForm = z.output<typeof memberChangeSchema>;
