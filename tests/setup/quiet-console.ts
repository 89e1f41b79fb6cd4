import { afterEach, beforeEach, expect, vi } from "vitest";

/** Unexpected output is a defect: a test that means to print silences the console itself. */
beforeEach(() => {
  vi.spyOn(console, "error");
  vi.spyOn(console, "warn");
});

afterEach(() => {
  const spoken = [console.error, console.warn].flatMap((spy) => (vi.isMockFunction(spy) ? spy.mock.calls : []));
  vi.restoreAllMocks();
  expect(spoken, "unexpected console output").toEqual([]);
});
