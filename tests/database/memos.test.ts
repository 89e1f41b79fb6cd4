import { copyFileSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, inject, it } from "vitest";
import type { Memo } from "~/db/models/memo.server";

const folder = mkdtempSync(path.join(tmpdir(), "galeprint-memos-"));

/** The database layer reads its file from the environment once, so everything that touches it is imported after. */
async function rooms() {
  process.env.DATABASE_FILE = path.join(folder, "galeprint.sqlite");
  process.env.DATA_DIRECTORY = folder;
  process.env.LOG_LEVEL = "silent";
  copyFileSync(inject("migratedDatabase"), process.env.DATABASE_FILE);
  return {
    ...(await import("../factories/project")),
    ...(await import("~/db/connection.server")),
    ...(await import("~/estimates/run-queue.server")),
    ...(await import("~/estimates/start-estimates.server")),
    ...(await import("~/memo/compose-draft.server")),
    ...(await import("~/memo/issue-memo.server")),
    ...(await import("~/memo/save-memo.server")),
    ...(await import("~/services/shutdown.server")),
    ...(await import("~/units/unit-choices")),
  };
}

let use: Awaited<ReturnType<typeof rooms>>;

beforeAll(async () => {
  use = await rooms();
});

afterAll(async () => {
  await use.closeEverything();
  await use.closeDatabase();
  rmSync(folder, { recursive: true, force: true });
});

/** A project with one current estimate, and a memo that points at it. */
async function begin(title: string) {
  const owner = await use.makeOrganisation();
  const { tenant, userId } = owner;
  const project = await use.makeProject(owner);
  const box = await use.makeBox(tenant, project.id);
  const storm = await use.makeStorm(owner, project.id);
  await use.makeWater(tenant, project.id);
  const cell = { studyBoxId: box.id, stormId: storm.id };
  const estimates = await use.startEstimates(tenant, project.id, userId, [cell], {});
  await use.queueIsEmpty();
  const values = { title, question: "Does it freshen?", findings: "", purpose: "information" as const, estimates };
  const begun = await use.beginMemo(tenant, project.id, userId, values);
  if (begun.fieldErrors) throw new Error(begun.fieldErrors.estimates.join(" "));
  const organisation = { name: "Thornholm Coastal", units: use.DEFAULT_UNITS, paperSize: "A4" as const };
  const actor = { id: userId, name: "R. Ansel", email: owner.email };
  const find = async (): Promise<Memo> => {
    const memo = await tenant.memos.find(begun.id);
    if (!memo) throw new Error("The memo is gone.");
    return memo;
  };
  const issue = async () => {
    const memo = await find();
    const { content } = await use.composeDraft(tenant, organisation, project, memo);
    return use.issueMemo({ tenant, organisation, project, memo, actor, content });
  };
  return { tenant, values, find, issue };
}

describe("issuing a memo", () => {
  it("is refused while the memo holds characters that its fonts do not draw, naming them and their place", async () => {
    const { tenant, values, find, issue } = await begin("Gale at 港");
    const refused = await issue();
    expect(refused).toEqual({
      refusal: expect.stringMatching(
        /^The memo's fonts cannot draw “港” \(U\+6E2F\) in the title\. Write this in other/,
      ),
    });
    expect(await tenant.memoRevisions.count({})).toBe(0);
    await use.changeMemo(tenant, await find(), { ...values, title: "Gale at the harbour" });
    expect(await issue()).toEqual({ revisionId: expect.any(String) });
    expect(await tenant.memoRevisions.count({})).toBe(1);
  });
});
