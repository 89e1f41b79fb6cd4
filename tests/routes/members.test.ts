import { afterAll, beforeAll, describe, expect, inject, test } from "vitest";
import { startMailbox, type Mailbox } from "../../app/cli/mailbox/mailbox";
import { HttpClient } from "../factories/http";
import { makeTenants, type Tenants } from "../factories/tenants";
import { startServer, type RunningServer } from "../setup/run-server";

let mailbox: Mailbox;
let server: RunningServer;
let tenants: Tenants;
let members: string;
let owner: HttpClient;
let admin: HttpClient;

beforeAll(async () => {
  mailbox = await startMailbox({ smtpPort: 0, port: 0 });
  tenants = await makeTenants(inject("seededDatabase"));
  server = await startServer({ databaseFile: tenants.databaseFile, env: { SMTP_URL: mailbox.smtpUrl } });
  members = `/o/${tenants.parameters.organisation}/members`;
  owner = await as("owner");
  admin = await as("admin");
});

afterAll(async () => {
  await server?.stop();
  await mailbox?.close();
  tenants?.remove();
});

const browser = () => new HttpClient(server.url);
const as = (who: keyof Tenants["people"]) => browser().signIn(tenants.people[who].email, tenants.people[who].password);

/** Invites someone and gives the path that their mail leads to. */
async function invite(email: string, fields: Record<string, string> = {}): Promise<string> {
  const from = mailbox.mails.length;
  const response = await owner.post(`${members}?index`, {
    intent: "invite",
    addresses: email,
    role: "consultant",
    ...fields,
  });
  expect(response.status).toBe(200);
  return linkOf(email, from);
}

async function linkOf(email: string, from: number): Promise<string> {
  const { text } = await mailbox.next(email, from);
  return new URL(/http\S+\/invitations\/\S+/.exec(text)?.[0] ?? "").pathname;
}

const NEWCOMER = { name: "N. Comer", password: "eleven oysters in a row" };

/** A new member with a browser that is signed in. */
async function newMember(email: string, fields?: Record<string, string>): Promise<HttpClient> {
  const client = browser();
  const joined = await client.post(await invite(email, fields), { ...NEWCOMER, name: email });
  expect(joined.headers.get("Location")).toBe(`/o/${tenants.parameters.organisation}`);
  return client;
}

/** Where a member's own page is, and the version on it. */
async function pageOf(email: string): Promise<{ path: string; version: string; text: string }> {
  const list = await (await owner.get(members)).text();
  // The head of the page names whoever is signed in.
  const row =
    list
      .split("<tr>")
      .slice(1)
      .find((each) => each.includes(email)) ?? "";
  const path = new RegExp(`href="(${members}/[a-z0-9]+)"`).exec(row)?.[1];
  if (path === undefined) throw new Error(`${email} is not on the page of members.`);
  const text = (await textOf(await owner.get(path))) ?? "";
  return { path, version: /name="version" value="(\d+)"/.exec(text)?.[1] ?? "", text };
}

async function change(client: HttpClient, email: string, fields: Record<string, string>): Promise<Response> {
  const { path, version } = await pageOf(email);
  return client.post(path, { version, ...fields });
}

/** What a page says; React parts neighbouring texts by comments. */
const textOf = async (response: Response | undefined) => (await response?.text())?.replaceAll("<!-- -->", "");

const statuses = (responses: Response[]) => responses.map(({ status }) => status).sort();

describe("an invitation", () => {
  test("is one mail an address, and makes whoever comes with its link a member, once", async () => {
    const from = mailbox.mails.length;
    const pasted = "New.One@quay.example; new.two@quay.example\nviewer@roles.example";
    const page = await (
      await owner.post(`${members}?index`, { intent: "invite", addresses: pasted, role: "viewer", mayCheck: "on" })
    ).text();
    expect(page).toContain(
      "Invited: new.one@quay.example, new.two@quay.example. Members already: viewer@roles.example.",
    );
    const link = await linkOf("new.one@quay.example", from);
    await linkOf("new.two@quay.example", from);
    expect(await textOf(await browser().get(link))).toContain("as viewer");
    const together = await Promise.all([1, 2, 3].map(() => browser().post(link, NEWCOMER)));
    const home = `/o/${tenants.parameters.organisation}`;
    expect(together.filter((response) => response.headers.get("Location") === home)).toHaveLength(1);
    expect((await browser().get(link)).status).toBe(404);
    expect((await browser().post(link, NEWCOMER)).headers.get("Location")).toBe(link);
    expect((await pageOf("new.one@quay.example")).text).toContain("viewer, may check");
  });

  test("of someone who has an account is theirs alone to accept", async () => {
    const link = await invite(tenants.people.otherTenant.email);
    expect(await textOf(await browser().get(link))).toContain("Sign in to accept");
    expect((await browser().post(link, NEWCOMER)).headers.get("Location")).toBe(link);
    const viewer = await as("viewer");
    expect(await textOf(await viewer.get(link))).toContain("You are signed in as viewer@roles.example");
    expect((await viewer.post(link, {})).headers.get("Location")).toBe(link);
    const guest = await as("otherTenant");
    expect((await guest.post(link, {})).headers.get("Location")).toBe(`/o/${tenants.parameters.organisation}`);
    expect(await (await guest.get("/o")).text()).toContain("Elsewhere Survey");
    expect((await guest.get(members)).status).toBe(200);
  });

  test("sent again opens by the new link only, and revoked by none", async () => {
    const email = "late@quay.example";
    const first = await invite(email);
    const id = /name="invitation" value="([a-z0-9]+)"/.exec(
      (await (await owner.get(members)).text()).split("<tr>").find((row) => row.includes(email)) ?? "",
    )?.[1];
    const from = mailbox.mails.length;
    await admin.post(`${members}?index`, { intent: "resend", invitation: id ?? "" });
    const second = await linkOf(email, from);
    expect((await browser().get(first)).status).toBe(404);
    expect((await browser().get(second)).status).toBe(200);
    await admin.post(`${members}?index`, { intent: "revoke", invitation: id ?? "" });
    expect((await browser().get(second)).status).toBe(404);
    expect((await browser().post(second, NEWCOMER)).headers.get("Location")).toBe(second);
    expect((await admin.post(`${members}?index`, { intent: "revoke", invitation: id ?? "" })).status).toBe(409);
  });

  test("is never for a role above one's own, and says which addresses are none", async () => {
    const fields = { intent: "invite", addresses: "boss@quay.example", role: "owner" };
    const refused = await admin.post(`${members}?index`, fields);
    expect(refused.status).toBe(400);
    expect(await textOf(refused)).toContain("Only an owner can invite an owner");
    const wrong = await admin.post(`${members}?index`, { ...fields, addresses: "a@quay.example, nonsense" });
    expect(await wrong.text()).toContain("Not an e-mail address: nonsense.");
  });
});

describe("a member", () => {
  test("who is removed or suspended can do nothing from their next request on", async () => {
    for (const [intent, email] of [
      ["remove", "leaver@quay.example"],
      ["suspend", "paused@quay.example"],
    ]) {
      const tab = await newMember(email);
      const newProject = `/o/${tenants.parameters.organisation}/projects/new`;
      expect((await tab.get(newProject)).status).toBe(200);
      expect((await change(admin, email, { intent })).status).toBeLessThan(400);
      const facts = { name: "Too late", jobNumber: email, client: "x", timeZone: "UTC", cautionsAccepted: "on" };
      expect((await tab.post(newProject, facts)).headers.get("Location")).toBe("/sign-in");
      expect((await tab.get(members)).status).toBe(302);
      await tab.signIn(email, NEWCOMER.password);
      expect((await tab.get(members)).status).toBe(404);
    }
    await change(admin, "paused@quay.example", { intent: "restore" });
    const back = await browser().signIn("paused@quay.example", NEWCOMER.password);
    expect((await back.get(members)).status).toBe(200);
  });

  test("loses a role at once, and of two changes made at once the second is told", async () => {
    const email = "changed@quay.example";
    const tab = await newMember(email);
    const { path, version } = await pageOf(email);
    const both = await Promise.all(
      ["viewer", "admin"].map((role) =>
        [owner, admin][role === "viewer" ? 0 : 1].post(path, { version, intent: "change", role }),
      ),
    );
    expect(statuses(both)).toEqual([200, 409]);
    const told = both.find(({ status }) => status === 409);
    expect(await told?.text()).toContain("Someone else changed this member");
    await change(owner, email, { intent: "change", role: "viewer" });
    expect((await tab.get(`/o/${tenants.parameters.organisation}/projects/new`)).status).toBe(403);
  });

  test("who is the originator of memos hands them on when they are removed", async () => {
    const email = "tomas.brae@merrowquill.example";
    const ida = await pageOf("ida.renholt@merrowquill.example");
    expect(ida.text).toContain("Who goes on with their memo");
    const refused = await change(owner, "ida.renholt@merrowquill.example", { intent: "remove" });
    expect(await textOf(refused)).toContain("Choose who goes on with their memos.");
    const successor = (await pageOf(email)).path.split("/").at(-1) ?? "";
    const removed = await change(owner, "ida.renholt@merrowquill.example", { intent: "remove", successor });
    expect(removed.headers.get("Location")).toBe(`${members}?removed`);
    const { project } = tenants.parameters;
    const memos = await (await owner.get(`/o/${tenants.parameters.organisation}/projects/${project}/memos`)).text();
    expect(memos).toContain("T. Brae");
    expect(memos).not.toContain("I. Renholt");
  });
});

describe("a forgotten password", () => {
  const email = "viewer@roles.example";

  test("is answered alike for an address with an account and for one without", async () => {
    const answers = await Promise.all(
      [email, "nobody@quay.example"].map(async (address) => {
        const response = await browser().post("/reset-password", { email: address });
        const notice = /role="status"[^>]*>(.*?)<\/p>/s.exec((await textOf(response)) ?? "")?.[1];
        return { status: response.status, notice };
      }),
    );
    expect(answers[0].notice).toContain("If this address has an account");
    expect(answers[1]).toEqual(answers[0]);
  });

  test("is replaced once by its link, which ends every sign-in and is told of by mail", async () => {
    const { text } = await mailbox.next(email);
    const link = new URL(/http\S+\/reset-password\/\S+/.exec(text)?.[0] ?? "").pathname;
    const tab = await as("viewer");
    const from = mailbox.mails.length;
    const short = await browser().post(link, { password: "short" });
    expect(short.status).toBe(400);
    const both = await Promise.all([1, 2].map(() => browser().post(link, { password: NEWCOMER.password })));
    expect(both.map((response) => response.headers.get("Location")).sort()).toEqual([link, "/sign-in?reset"].sort());
    expect((await browser().get(link)).status).toBe(404);
    expect((await tab.get(members)).status).toBe(302);
    expect((await mailbox.next(email, from)).subject).toBe("Your Galeprint password was changed");
    await expect(as("viewer")).rejects.toThrow("400");
    expect((await (await browser().signIn(email, NEWCOMER.password)).get(members)).status).toBe(200);
  });
});

describe("owners", () => {
  test("cannot be touched by an admin", async () => {
    const { email } = tenants.people.owner;
    for (const intent of ["suspend", "remove", "hand-over"]) {
      expect(await (await change(admin, email, { intent })).text()).toContain("Only an owner");
    }
  });

  test("who remove each other at the same moment leave one", async () => {
    const second = await newMember("second@quay.example", { role: "owner" });
    const [first, other] = [await pageOf(tenants.people.owner.email), await pageOf("second@quay.example")];
    const both = await Promise.all([
      owner.post(other.path, { version: other.version, intent: "remove" }),
      second.post(first.path, { version: first.version, intent: "remove" }),
    ]);
    // The other one has been signed out, or is no longer a member, or is told: which of them depends on the moment.
    const done = both.filter((response) => response.headers.get("Location") === `${members}?removed`);
    expect(done).toHaveLength(1);
    owner = both[0] === done[0] ? owner : second;
    const { version, path } = await pageOf(both[0] === done[0] ? tenants.people.owner.email : "second@quay.example");
    const undoings: Record<string, string>[] = [{ intent: "change", role: "admin" }, { intent: "remove" }];
    for (const fields of undoings) {
      const refused = await owner.post(path, { version, ...fields });
      expect(refused.status).toBe(409);
      expect(await textOf(refused)).toContain("last owner");
    }
  });

  test("hand the ownership over in one step", async () => {
    const heir = tenants.people.admin.email;
    expect((await change(owner, heir, { intent: "hand-over" })).status).toBe(302);
    const list = await (await owner.get(members)).text();
    expect(list).toContain(`${tenants.parameters.organisation}/members`);
    expect(await (await change(owner, heir, { intent: "suspend" })).text()).toContain("Only an owner");
  });
});
