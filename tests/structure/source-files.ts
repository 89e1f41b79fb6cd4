import { readdirSync } from "node:fs";
import path from "node:path";

/** Every TypeScript source of a folder and those in it, as paths from the repository's root with slashes. */
export function sourceFiles(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const place = path.posix.join(folder, entry.name);
    if (entry.isDirectory()) return sourceFiles(place);
    return /\.tsx?$/.test(entry.name) && !entry.name.endsWith(".d.ts") ? [place] : [];
  });
}
