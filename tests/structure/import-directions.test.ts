import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { breachesOf } from "./import-rules";
import { sourceFiles } from "./source-files";

/** Read from the text of the URL map, since running it needs the build tool. */
function routeModules(): Set<string> {
  const map = readFileSync("app/routes.ts", "utf8");
  return new Set([...map.matchAll(/"(routes\/[^"]+)\.tsx?"/g)].map((match) => `app/${match[1]}`));
}

const none: ReadonlySet<string> = new Set();

describe("the order of the rooms", () => {
  const files = sourceFiles("app");
  const routes = routeModules();

  it("is looked at in every file", () => {
    expect(files).toContain("app/server.ts");
    expect(files).toContain("app/services/config.server.ts");
    expect(routes).toContain("app/routes/public/landing");
  });

  it("is kept", () => {
    expect(files.flatMap((file) => breachesOf(file, readFileSync(file, "utf8"), routes))).toEqual([]);
  });
});

describe("breachesOf", () => {
  it.each([
    ["app/units/format.ts", 'import { x } from "~/ocean/x";', "units may not import app/ocean/x"],
    ["app/units/format.ts", 'import { x } from "../context";', "units may not import app/context"],
    [
      "app/ocean/stress/drag.ts",
      'import type { X } from "~/figures/figure";',
      "ocean may not import app/figures/figure",
    ],
    ["app/ocean/stress/drag.ts", 'export * from "../../readers/reading";', "ocean may not import app/readers/reading"],
    ["app/figures/wind.ts", 'import { estimate } from "~/ocean/estimate";', "figures may take only types from ocean"],
    ["app/figures/wind.ts", 'import type { M } from "~/memo/document";', "figures may not import app/memo/document"],
    ["app/readers/track.ts", 'import { readFileSync } from "node:fs";', "reaches Node outside a *.server file"],
    ["app/components/field.tsx", 'import path from "path";', "reaches Node outside a *.server file"],
    ["app/estimates/what-if.ts", 'const fs = await import("node:fs");', "reaches Node outside a *.server file"],
    [
      "app/routes/org/list.tsx",
      'import { Storm } from "~/db/models/storm.server";',
      "reaches the database outside a *.server file",
    ],
    ["app/memo/compose.ts", 'import { useIt } from "~/routes/org/list";', "imports a route"],
    ["app/routes/org/list.tsx", 'import type { Route } from "./+types/other";', "imports the types of another route"],
    ["app/routes/org/list.tsx", 'import type { Route } from "../+types/list";', "imports the types of another route"],
  ])("finds in %s: %s", (file, source, fault) => {
    expect(breachesOf(file, source, none)).toEqual([expect.stringContaining(fault)]);
  });

  it("finds one route that imports another, but lets routes share what is not one", () => {
    const source = 'import { Form } from "./edit";';
    expect(breachesOf("app/routes/org/new.tsx", source, new Set(["app/routes/org/edit"]))).toHaveLength(1);
    expect(breachesOf("app/routes/org/new.tsx", source, none)).toEqual([]);
  });

  it.each([
    ["app/ocean/slab/slab.ts", "const now = Date.now();", "reads the clock"],
    ["app/readers/series.ts", "const today = new Date();", "reads the clock"],
    ["app/ocean/ensemble/draw.ts", "const x = Math.random();", "draws unseeded random numbers"],
    ["app/memo/compose.ts", 'const answer = await fetch("/x");', "does input or output"],
  ])("finds in %s: %s", (file, source, fault) => {
    expect(breachesOf(file, source, none)).toEqual([`${file} ${fault}`]);
  });

  it.each([
    ["app/ocean/slab/slab.ts", 'import { x } from "~/units/x";\n// Math.random() is not for engines\nnew Date(0);'],
    ["app/figures/wind.ts", 'import { type Response } from "~/ocean/response";'],
    [
      "app/estimates/start.server.ts",
      'import { readFile } from "node:fs/promises"; import { s } from "~/db/scoped.server";',
    ],
    ["app/units/format.test.ts", 'import { readFileSync } from "node:fs"; import { x } from "~/ocean/x";'],
    [
      "app/routes/org/list.tsx",
      'import type { Route } from "./+types/list"; import type { S } from "~/db/models/s.server";',
    ],
    ["app/cli/galeprint.ts", 'import { migrate } from "~/db/migrate.server"; import path from "node:path";'],
  ])("lets pass in %s: %s", (file, source) => {
    expect(breachesOf(file, source, none)).toEqual([]);
  });
});
