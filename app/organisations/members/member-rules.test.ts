import { describe, expect, it } from "vitest";
import { usualStanding, type Role } from "../permissions";
import { refusalOf, type MemberChange, type MemberSituation } from "./member-rules";

const owner = usualStanding("owner");
const admin = usualStanding("admin");
const to = (role: Role): MemberChange => ({ kind: "change", to: usualStanding(role) });
const situation = (over: Partial<MemberSituation>): MemberSituation => ({
  actor: owner,
  isSelf: false,
  target: { role: "consultant", suspended: false },
  activeOwners: 1,
  ...over,
});

describe("refusalOf", () => {
  it("keeps the last owner, whoever asks and whatever for", () => {
    const last = situation({ isSelf: true, target: { role: "owner", suspended: false } });
    for (const change of [to("admin"), { kind: "suspend" }, { kind: "remove" }] satisfies MemberChange[]) {
      expect(refusalOf(change, last)).toMatch(/last owner/);
    }
    expect(refusalOf(to("admin"), { ...last, activeOwners: 2 })).toBeNull();
    expect(refusalOf(to("owner"), last)).toBeNull();
  });

  it("lets a suspended owner be removed while another is there", () => {
    const target = { role: "owner" as const, suspended: true };
    expect(refusalOf({ kind: "remove" }, situation({ target }))).toBeNull();
  });

  it("leaves owners to owners", () => {
    const ofOwner = situation({ actor: admin, target: { role: "owner", suspended: false }, activeOwners: 2 });
    for (const change of [to("viewer"), { kind: "suspend" }, { kind: "remove" }] satisfies MemberChange[]) {
      expect(refusalOf(change, ofOwner)).toMatch(/Only an owner/);
    }
    expect(refusalOf(to("owner"), situation({ actor: admin }))).toMatch(/Only an owner/);
    expect(refusalOf({ kind: "hand-over" }, situation({ actor: admin }))).toMatch(/Only an owner/);
  });

  it("lets an admin manage everyone else", () => {
    for (const change of [to("viewer"), { kind: "suspend" }, { kind: "remove" }] satisfies MemberChange[]) {
      expect(refusalOf(change, situation({ actor: admin }))).toBeNull();
    }
  });

  it("keeps people from locking themselves out by a slip", () => {
    expect(refusalOf({ kind: "suspend" }, situation({ actor: admin, isSelf: true }))).toMatch(/yourself/);
    expect(refusalOf({ kind: "hand-over" }, situation({ isSelf: true }))).toMatch(/already/);
  });
});
