import { afterAll, beforeAll, describe, expect, inject, test } from "vitest";
import { may, ROLES, usualStanding, type Role } from "../../app/organisations/permissions";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";
import { routeTable, type RouteEntry } from "./route-table";
import { RULES, type Rule } from "./rules";

const entries = await routeTable();

test("every route of routes.ts has a rule, and every rule a route", () => {
  expect(entries.map(({ file }) => file).sort()).toEqual(Object.keys(RULES).sort());
});

type Who = "anonymous" | "otherTenant" | "suspended" | Role;
const EVERYONE: Who[] = ["anonymous", "otherTenant", "suspended", ...ROLES];

let server: RunningServer;
let tenants: Tenants;
const clients = new Map<Who, HttpClient>();

beforeAll(async () => {
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile });
  clients.set("anonymous", new HttpClient(server.url));
  for (const who of EVERYONE) {
    if (who === "anonymous") continue;
    const { email, password } = tenants.people[who];
    clients.set(who, await new HttpClient(server.url).signIn(email, password));
  }
});

afterAll(async () => {
  await server?.stop();
  tenants?.remove();
});

function client(who: Who): HttpClient {
  const found = clients.get(who);
  if (!found) throw new Error(`Nobody is signed in as ${who}.`);
  return found;
}

function filled(pattern: string): string {
  return pattern.replace(/\/\*$/, "/no-such-address").replace(/:(\w+)/g, (_, name: string) => {
    const value = tenants.parameters[name];
    if (value === undefined) throw new Error(`The matrix has no value for :${name}.`);
    return value;
  });
}

const addressOf = ({ path }: RouteEntry) => filled(path);

type Outcome = "signIn" | "notFound" | "forbidden" | "allowed";

/** What the rule makes of a person. */
function expected(rule: NonNullable<Rule["get"]>, who: Who): Outcome {
  if (rule === "public") return "allowed";
  if (who === "anonymous") return "signIn";
  if (rule === "signedIn") return "allowed";
  if (who === "otherTenant" || who === "suspended") return "notFound";
  return may(usualStanding(who), rule) ? "allowed" : "forbidden";
}

/** What the server made of a request: a single-fetch answer carries redirects in its body. */
async function outcome(response: Response): Promise<Outcome | string> {
  const location = response.headers.get("Location") ?? "";
  const body = response.status === 202 ? await response.text() : "";
  if (location.startsWith("/sign-in") || body.includes("/sign-in")) return "signIn";
  if (response.status === 404) return "notFound";
  if (response.status === 403) return "forbidden";
  if (response.status === 405) return "no action here";
  if (response.status >= 500) return `status ${response.status}: ${(await response.text()).slice(0, 300)}`;
  return "allowed";
}

/** Routes whose own business is to answer 404 or to send people to sign in. */
const ANSWERS_BY_ITSELF = new Set([
  "routes/public/not-found.tsx",
  "routes/share/open.tsx",
  "routes/share/memo.tsx",
  "routes/share/pdf.ts",
  "routes/account/sign-in.tsx",
  "routes/account/sign-up.tsx",
  "routes/account/sign-out.tsx",
  "routes/account/reset-password.tsx",
  "routes/account/invitation.tsx",
  "routes/public/landing.tsx",
  "routes/basemap-tile.ts",
]);

const guarded = entries.filter(({ file }) => !ANSWERS_BY_ITSELF.has(file));

describe.each(EVERYONE)("%s", (who) => {
  test.each(guarded)("opens $path as its rule says", async (entry) => {
    const rule = RULES[entry.file];
    if (rule.get === null) return;
    expect(await outcome(await client(who).get(addressOf(entry)))).toBe(expected(rule.get, who));
  });

  test.each(guarded.filter(({ file }) => !RULES[file].resource))("asks for the data of $path", async (entry) => {
    const rule = RULES[entry.file];
    if (rule.get === null) return;
    const response = await client(who).get(`${addressOf(entry)}.data`);
    expect(await outcome(response)).toBe(expected(rule.get, who));
  });

  test.each(guarded)("posts to $path as its rule says", async (entry) => {
    const rule = RULES[entry.file];
    const response = await client(who).post(filled(entry.formPath), { "nothing-known": "1" });
    if (rule.post !== null) {
      expect(await outcome(response)).toBe(expected(rule.post, who));
      return;
    }
    // No action: refused by whichever comes first, never done.
    expect(response.status).toBeGreaterThanOrEqual(300);
    expect(response.status).toBeLessThan(500);
  });
});

describe("another tenant", () => {
  test.each(guarded.filter(({ path }) => path.includes(":project")))(
    "finds nothing under their own address with foreign ids at $path",
    async (entry) => {
      const address = addressOf(entry).replace(tenants.parameters.organisation, tenants.otherOrganisation);
      for (const response of [
        await client("otherTenant").get(address),
        await client("otherTenant").post(address + (entry.formPath.endsWith("?index") ? "?index" : ""), {
          intent: "delete",
        }),
      ]) {
        expect([404, 405]).toContain(response.status);
      }
    },
  );

  test("finds nothing inside their own project with foreign ids", async () => {
    const { project, organisation } = tenants.parameters;
    for (const entry of guarded.filter(({ path }) => /:project\/.*:/.test(path))) {
      const address = addressOf(entry)
        .replace(`/o/${organisation}/`, `/o/${tenants.otherOrganisation}/`)
        .replace(`/projects/${project}/`, `/projects/${tenants.otherProject}/`);
      expect((await client("otherTenant").get(address)).status, address).toBe(404);
    }
  });
});

test("a form from another site is refused, whoever is signed in", async () => {
  const address = `/o/${tenants.parameters.organisation}/projects/new`;
  for (const headers of [
    { Origin: "https://elsewhere.example", "Sec-Fetch-Site": "cross-site" },
    { Origin: "https://elsewhere.example" },
    {},
  ]) {
    const response = await client("owner").postFrom(address, { name: "x" }, headers as Record<string, string>);
    expect(response.status).toBeGreaterThanOrEqual(400);
    expect(response.status).toBeLessThan(500);
  }
});
