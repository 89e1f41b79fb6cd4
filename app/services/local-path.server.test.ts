import fc from "fast-check";
import { expect, test } from "vitest";
import { localPath } from "./local-path.server";

test.each([
  ["/o/thing?page=2", "/o/thing?page=2"],
  ["/", "/"],
  [undefined, null],
  ["", null],
  ["o/thing", null],
  ["//elsewhere.example", null],
  ["/\\elsewhere.example", null],
  ["https://elsewhere.example", null],
  ["/\t/elsewhere.example", null],
])("%j leads to %j", (path, there) => {
  expect(localPath(path)).toBe(there);
});

test("never leads to another site, whatever is written", () => {
  fc.assert(
    fc.property(
      fc.oneof(
        fc.string(),
        fc.webUrl(),
        fc.string().map((rest) => `/${rest}`),
      ),
      (path) => {
        const there = localPath(path);
        if (there !== null) expect(new URL(there, "https://here.example").origin).toBe("https://here.example");
      },
    ),
  );
});
