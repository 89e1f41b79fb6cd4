import { describe, expect, it } from "vitest";
import { invitationSchema, MOST_INVITED_AT_ONCE, readAddresses } from "./member-schema";

describe("readAddresses", () => {
  it.each([
    ["one@a.example", ["one@a.example"]],
    [" One@A.example ,two@a.example;\n three@a.example\r\n", ["one@a.example", "two@a.example", "three@a.example"]],
    ['"Brae, T." <t.brae@a.example>', ["t.brae@a.example"]],
    ["a@a.example a@a.example", ["a@a.example"]],
    [" \n ", []],
  ])("reads %j", (pasted, addresses) => {
    expect(readAddresses(pasted)).toEqual(addresses);
  });
});

describe("invitationSchema", () => {
  const messages = (addresses: string) =>
    invitationSchema.safeParse({ addresses, role: "viewer" }).error?.issues.map(({ message }) => message);

  it("names what is not an address, and says when there are none or too many", () => {
    expect(messages("a@a.example, b@")).toEqual(["Not an e-mail address: b@."]);
    expect(messages(" ")).toEqual(["Write at least one e-mail address."]);
    const many = Array.from({ length: MOST_INVITED_AT_ONCE + 1 }, (_, index) => `p${index}@a.example`).join("\n");
    expect(messages(many)?.[0]).toMatch(/at most 50/);
    expect(messages("a@a.example")).toBeUndefined();
  });
});
