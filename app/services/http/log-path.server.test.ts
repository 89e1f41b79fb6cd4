import { expect, it } from "vitest";
import { logPath } from "./log-path.server";

it.each([
  ["/", "/"],
  ["/o/north-coast/projects?search=ana%40example.com", "/o/north-coast/projects"],
  ["/s/Zm9vYmFyYmF6cXV4", "/s/***"],
  ["/S/Zm9vYmFyYmF6cXV4.data?_routes=x", "/S/***"],
  ["/s/Zm9vYmFyYmF6cXV4/memo.pdf", "/s/***/memo.pdf"],
  ["/invitations/Zm9vYmFy", "/invitations/***"],
  ["/reset-password/Zm9vYmFy#x", "/reset-password/***"],
  ["/s", "/s"],
  ["/s/", "/s/"],
  ["//s//token", "//s//***"],
  ["/%73/token", "/%73/***"],
  ["/%zz/page", "/%zz/page"],
])("logs %s as %s", (url, logged) => {
  expect(logPath(url)).toBe(logged);
});

it("keeps a line short", () => {
  expect(logPath(`/${"a".repeat(10_000)}`)).toHaveLength(500);
});
