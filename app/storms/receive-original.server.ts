import {
  FormDataParseError,
  MaxFileSizeExceededError,
  MaxFilesExceededError,
  MaxTotalSizeExceededError,
  parseFormData,
} from "@remix-run/form-data-parser";
import { data } from "react-router";
import { config } from "~/services/config.server";
import type { Original } from "./original.server";
import { StormRefusal } from "./refusal";

const MEGABYTE = 1024 * 1024;
const OVERHEAD = MEGABYTE;

/**
 * Reads a form that may carry a file, never holding more than the upload limit.
 * @throws StormRefusal for a file that is too large, Response 400 for what is no form
 */
export async function receiveForm(request: Request): Promise<FormData> {
  const limit = config().uploadLimitBytes;
  try {
    return await parseFormData(request, {
      maxFiles: 1,
      maxFileSize: limit,
      maxTotalSize: limit + OVERHEAD,
      maxParts: 2000,
    });
  } catch (error) {
    if (error instanceof MaxFileSizeExceededError || error instanceof MaxTotalSizeExceededError) {
      throw new StormRefusal(tooLarge(limit), "file");
    }
    if (error instanceof MaxFilesExceededError) throw new StormRefusal("Bring one file at a time.", "file");
    if (error instanceof FormDataParseError) throw data("This request is not a form.", { status: 400 });
    throw error;
  }
}

function tooLarge(limit: number): string {
  return `The file is larger than ${limit / MEGABYTE} MB, the most that is taken at once. Nothing was saved. Cut it to the days around the storm, or leave out columns.`;
}

/**
 * The file or the pasted grid of a form, whichever is there.
 * @throws StormRefusal where neither is, or both are
 */
export async function originalFrom(form: FormData): Promise<Original> {
  const file = form.get("file");
  const chosen = file instanceof File && (file.name !== "" || file.size > 0) ? file : null;
  const pastedField = form.get("pasted");
  const pasted = typeof pastedField === "string" ? pastedField : "";
  if (chosen && pasted.trim() !== "") {
    throw new StormRefusal("Bring either a file or a pasted grid, not both: empty one of the two.", "pasted");
  }
  if (chosen) {
    return { name: baseName(chosen.name), bytes: new Uint8Array(await chosen.arrayBuffer()), origin: "file" };
  }
  if (pasted.trim() !== "") {
    return { name: "pasted grid", bytes: new TextEncoder().encode(pasted), origin: "pasted" };
  }
  throw new StormRefusal("Choose a file, or paste the rows.", "file");
}

/** Browsers send the name alone, other senders may send a path; control characters have no place in a name. */
function baseName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? "";
  return (
    last
      .replace(/\p{Cc}/gu, "")
      .trim()
      .slice(-255) || "unnamed file"
  );
}
