import { afterAll, beforeAll, describe, expect, inject, test } from "vitest";
import { DEMO } from "../../app/db/seeders/demo-scenario";
import { HttpClient } from "../factories/http";
import { startServer, type RunningServer } from "../setup/run-server";

const EMAIL = DEMO.people[0].email;
const COOKIE = "__Host-galeprint";
let server: RunningServer;

beforeAll(async () => {
  server = await startServer({ databaseFile: inject("seededDatabase") });
});

afterAll(async () => {
  await server?.stop();
});

const browser = () => new HttpClient(server.url);

/** What the page says is wrong, without the parts that change from one answer to the next. */
async function refusalOf(response: Response): Promise<{ status: number; alert: string | undefined }> {
  return { status: response.status, alert: /role="alert"[^>]*>(.*?)<\/div>/s.exec(await response.text())?.[1] };
}

describe("signing in", () => {
  test("gives the same answer for an unknown address and for a wrong password", async () => {
    const wrong = await refusalOf(await browser().post("/sign-in", { email: EMAIL, password: "not the password" }));
    const unknown = await refusalOf(
      await browser().post("/sign-in", { email: "nobody@nowhere.example", password: "not the password" }),
    );
    expect(wrong.status).toBe(400);
    expect(wrong.alert).toContain("do not belong together");
    expect(unknown).toEqual(wrong);
  });

  test("never sends a password back", async () => {
    const response = await browser().post("/sign-in", { email: EMAIL, password: "a very particular secret" });
    expect(await response.text()).not.toContain("a very particular secret");
  });

  test("sets a cookie that scripts and other hosts cannot have", async () => {
    const response = await browser().post("/sign-in", { email: EMAIL, password: DEMO.password });
    const [cookie] = response.headers.getSetCookie();
    expect(response.status).toBe(302);
    for (const part of [`${COOKIE}=`, "Path=/", "HttpOnly", "Secure", "SameSite=Lax"]) expect(cookie).toContain(part);
    expect(cookie).not.toMatch(/Domain=/i);
  });

  test("changes the session's identifier, and the old one is worth nothing", async () => {
    const client = await browser().signIn(EMAIL, DEMO.password);
    const before = client.cookie(COOKIE);
    const stolen = browser();
    stolen.setCookie(COOKIE, before ?? "");
    expect((await stolen.get(`/o/${DEMO.slug}`)).status).toBe(200);
    await client.post("/sign-out", {});
    await client.signIn(EMAIL, DEMO.password);
    expect(client.cookie(COOKIE)).not.toBe(before);
    expect((await stolen.get(`/o/${DEMO.slug}`)).status).toBe(302);
  });

  test("goes on to a page of this site only", async () => {
    const page = `/o/${DEMO.slug}/method-sheets`;
    const there = await browser().post("/sign-in", { email: EMAIL, password: DEMO.password, to: page });
    expect(there.headers.get("Location")).toBe(page);
    for (const to of [
      "https://elsewhere.example/",
      "//elsewhere.example",
      "/\\elsewhere.example",
      "javascript:alert(1)",
    ]) {
      const response = await browser().post("/sign-in", { email: EMAIL, password: DEMO.password, to });
      expect(response.headers.get("Location"), to).toBe("/o");
    }
  });

  test("slows one place that tries one address again and again, and nobody else's address", async () => {
    const email = "guessed@nowhere.example";
    let last = "";
    for (let attempt = 0; attempt < 9; attempt++) {
      last = (await refusalOf(await browser().post("/sign-in", { email, password: `guess ${attempt}` }))).alert ?? "";
    }
    expect(last).toContain("Too many attempts");
    expect((await browser().post("/sign-in", { email: EMAIL, password: DEMO.password })).status).toBe(302);
  });
});

describe("signing up", () => {
  const VALUES = {
    organisationName: "Sandbar & Sons",
    name: "S. Bar",
    email: "s.bar@sandbar.example",
    password: "nine grey herring gulls",
  };

  test("says beside each field what is wrong, and keeps what was written", async () => {
    const response = await browser().post("/sign-up", { ...VALUES, email: "no address", password: "short" });
    const page = await response.text();
    expect(response.status).toBe(400);
    expect(page).toContain("Write an address such as");
    expect(page).toContain("at least 12 characters");
    expect(page).toContain("Sandbar &amp; Sons");
    expect(page).not.toContain("short");
  });

  test("makes an owner with an organisation and a method sheet; a second of the same name gets its own address", async () => {
    const first = browser();
    expect((await first.post("/sign-up", VALUES)).headers.get("Location")).toBe("/o/sandbar-sons");
    expect(await (await first.get("/o/sandbar-sons/method-sheets")).text()).toContain("Slab with its range");
    const second = await browser().post("/sign-up", { ...VALUES, email: "t.bar@sandbar.example" });
    expect(second.headers.get("Location")).toBe("/o/sandbar-sons-2");
    const again = await browser().post("/sign-up", VALUES);
    expect(again.status).toBe(400);
  });
});
