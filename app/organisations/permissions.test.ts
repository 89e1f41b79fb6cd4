import { describe, expect, it } from "vitest";
import { ACTIONS, may, rightsTable, ROLES, usualStanding, type Action } from "./permissions";

const actions = Object.keys(ACTIONS) as Action[];

describe("the table of rights", () => {
  it("says of every action and role what is enforced", () => {
    const table = rightsTable();
    expect(table.map(({ action }) => action)).toEqual(actions);
    for (const { action, answers } of table) {
      ROLES.forEach((role, column) => {
        const without = may({ role, mayCheck: false, mayIssue: false }, action);
        const withRights = may({ role, mayCheck: true, mayIssue: true }, action);
        const said = without === withRights ? (without ? "yes" : "no") : "by right";
        expect(answers[column], `${role} ${action}`).toBe(said);
      });
    }
  });

  it("gives each role all that the next one may, and a viewer nothing to change", () => {
    const allowed = ROLES.map((role) => actions.filter((action) => may(usualStanding(role), action)));
    for (let index = 1; index < allowed.length; index++) {
      expect(allowed[index - 1]).toEqual(expect.arrayContaining(allowed[index]));
    }
    expect(allowed[ROLES.indexOf("viewer")]).toEqual(["project.view"]);
  });

  it("keeps each signature to its own right", () => {
    expect(may({ role: "owner", mayCheck: false, mayIssue: true }, "memo.check")).toBe(false);
    expect(may({ role: "viewer", mayCheck: true, mayIssue: false }, "memo.check")).toBe(true);
    expect(may({ role: "viewer", mayCheck: true, mayIssue: false }, "memo.issue")).toBe(false);
  });
});
