import { builtinModules } from "node:module";
import path from "node:path";
import { importsOf, type Import } from "./imports";

/** Rooms that run anywhere: in the server, in a worker, in the browser. */
const PURE_ROOMS = ["units", "ocean", "figures", "readers", "quality", "memo"];

/** What the lowest rooms may import beside themselves. A room that is not named here may import any but the routes. */
const ALLOWED_ROOMS: Record<string, string[]> = { units: [], ocean: ["units"], figures: ["units", "ocean"] };

const CLOCK_AND_CHANCE = [
  { pattern: /\bDate\.now\(|\bnew Date\(\s*\)|\bperformance\.now\(|\bTemporal\.Now\b/, what: "reads the clock" },
  { pattern: /\bMath\.random\(|\bcrypto\.(?:randomUUID|getRandomValues)\(/, what: "draws unseeded random numbers" },
  { pattern: /(?<![.\w])fetch\(|\bprocess\.(?:env|argv|cwd)\b|\bconsole\.\w/, what: "does input or output" },
];

const isTest = (file: string) => /\.test\.tsx?$/.test(file);
const isServerOnly = (file: string) => /\.server\.tsx?$/.test(file);

/** The room of a path from the root: `units` of `app/units/format`; undefined for files that lie in app itself. */
function roomOf(place: string): string | undefined {
  const [top, room, ...rest] = place.split("/");
  return top === "app" && rest.length > 0 ? room : undefined;
}

function mayReachNode(file: string): boolean {
  return (
    isServerOnly(file) ||
    isTest(file) ||
    file.startsWith("app/cli/") ||
    file === "app/server.ts" ||
    file.endsWith("-worker.ts")
  );
}

function mayReachDatabase(file: string): boolean {
  return mayReachNode(file) || roomOf(file) === "db";
}

function faultOf(file: string, imported: Import, routeModules: ReadonlySet<string>): string | undefined {
  const { specifier, target, typeOnly } = imported;
  const room = roomOf(file);
  if (target === undefined) {
    const isNode = specifier.startsWith("node:") || builtinModules.includes(specifier.split("/")[0]);
    return isNode && !typeOnly && !mayReachNode(file) ? "reaches Node outside a *.server file" : undefined;
  }
  if (target.includes("/+types/")) {
    const own = path.posix.join(path.posix.dirname(file), "+types", path.posix.basename(file).replace(/\.tsx?$/, ""));
    return target === own ? undefined : "imports the types of another route";
  }
  const targetRoom = roomOf(target);
  if (targetRoom === "routes" && room !== "routes") return "imports a route";
  if (routeModules.has(target)) return "imports a route";
  if (targetRoom === "db" && !typeOnly && !mayReachDatabase(file))
    return "reaches the database outside a *.server file";
  if (isTest(file) || room === undefined || !Object.hasOwn(ALLOWED_ROOMS, room)) return undefined;
  if (targetRoom === room) return undefined;
  if (targetRoom === undefined || !ALLOWED_ROOMS[room].includes(targetRoom)) return `${room} may not import ${target}`;
  if (room === "figures" && targetRoom === "ocean" && !typeOnly) return "figures may take only types from ocean";
  return undefined;
}

/** Comments may speak of what code may not do. */
function withoutComments(source: string): string {
  return source.replace(/\/\*[\s\S]*?\*\//g, "").replace(/(^|\s)\/\/.*$/gm, "$1");
}

/**
 * What a file does against the order of the rooms: one line each, `file:line what (import)`.
 * @param routeModules files that the URL map names, from the root without extension
 */
export function breachesOf(file: string, source: string, routeModules: ReadonlySet<string>): string[] {
  const breaches = importsOf(file, source).flatMap((imported) => {
    const fault = faultOf(file, imported, routeModules);
    return fault === undefined ? [] : [`${file}:${imported.line} ${fault} (${imported.specifier})`];
  });
  if (PURE_ROOMS.includes(roomOf(file) ?? "") && !isServerOnly(file) && !isTest(file)) {
    const code = withoutComments(source);
    for (const { pattern, what } of CLOCK_AND_CHANCE) if (pattern.test(code)) breaches.push(`${file} ${what}`);
  }
  return breaches;
}
