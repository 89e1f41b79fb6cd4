import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { z } from "zod";

const SOURCE = fileURLToPath(new URL("plain-c/benchmark.c", import.meta.url));
const FORMULAS = fileURLToPath(new URL("../../app/ocean/seawater/specific-volume.ts", import.meta.url));

const figures = z.object({ nanoseconds: z.number() }).catchall(z.number());
export type PlainCFigures = z.infer<typeof figures>;

/** The benchmark in plain C, compiled anew, so that both languages are timed on the same machine in the same minute. */
export interface PlainC {
  run: (...args: (string | number)[]) => PlainCFigures;
  remove: () => void;
}

/** @returns null where the machine has no C compiler */
export function compilePlainC(): PlainC | null {
  const compiler = ["gcc", "clang", "cc"].find((name) => spawnSync(name, ["--version"]).status === 0);
  if (!compiler) return null;
  const folder = mkdtempSync(path.join(tmpdir(), "galeprint-bench-"));
  const program = path.join(folder, "benchmark");
  writeFileSync(path.join(folder, "specific-volume.h"), polynomialsAsC(readFileSync(FORMULAS, "utf8")));
  // No fused multiply-add: JavaScript has none, and its results are to be the same.
  execFileSync(compiler, ["-O3", "-march=native", "-ffp-contract=off", "-I", folder, SOURCE, "-lm", "-o", program]);
  return {
    run: (...args) => figures.parse(JSON.parse(execFileSync(program, args.map(String), { encoding: "utf8" }))),
    remove: () => rmSync(folder, { recursive: true }),
  };
}

/** The engine's own formulas in C's words: the two cannot differ in a coefficient. */
function polynomialsAsC(source: string): string {
  const body = (name: string, opening: string, closing: string): string => {
    const start = source.indexOf(opening, source.indexOf(`export function ${name}(`)) + opening.length;
    return source
      .slice(start, source.indexOf(closing, start))
      .replaceAll("const ", "const double ")
      .replaceAll("Math.sqrt", "sqrt");
  };
  return [
    "static inline double surface_specific_volume(double SA, double CT) {",
    body("surfaceSpecificVolume", "{\n", "\n}"),
    "}",
    "static inline double surface_density(double SA, double CT) { return 1 / surface_specific_volume(SA, CT); }",
    "static inline void specific_volume_slopes(double *v, double *dvdCT, double *dvdSA,",
    "  const double *SA, const double *CT, const double *p, int n) {",
    "  for (int k = 0; k < n; k++) {",
    body("specificVolumeSlopesInto", "k++) {\n", "\n  }\n}"),
    "  }",
    "}",
    "",
  ].join("\n");
}
