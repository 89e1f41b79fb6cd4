import { parseWithZod } from "@conform-to/zod/v4";
import type { Submission } from "@conform-to/react";
import { data } from "react-router";
import type { z } from "zod";

/** Reads a form by its schema. What cannot be read as a form at all is the sender's fault: 400. */
export async function readForm<Schema extends z.ZodType>(
  request: Request,
  schema: Schema,
): Promise<Submission<z.output<Schema>, string[]>> {
  const form = await request.formData().catch(() => {
    throw data("This request is not a form.", { status: 400 });
  });
  return parseWithZod(form, { schema }) as Submission<z.output<Schema>, string[]>;
}
