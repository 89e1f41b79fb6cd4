import { describe, expect, it } from "vitest";
import { chooseRequestId, clientAddressOf, requestIdOf } from "./request-facts.server";

describe("chooseRequestId", () => {
  it.each(["4bf92f3577b34da6", "req-2026.12.01_a", "a1b2c3d4"])("keeps the sane id %s", (id) => {
    expect(chooseRequestId(id)).toBe(id);
  });

  it.each([undefined, "", "short", "has blank inside", 'a"},{"b":1', "x".repeat(65), "-leading", "zeile\numbruch"])(
    "makes a new one in place of %o",
    (id) => {
      const made = chooseRequestId(id);
      expect(made).toMatch(/^[0-9a-f-]{36}$/);
      expect(chooseRequestId(id)).not.toBe(made);
    },
  );
});

it("reads what the server found out from the request", () => {
  const request = new Request("http://localhost/", {
    headers: { "x-request-id": "a1b2c3d4", "x-galeprint-client-address": "192.0.2.7" },
  });
  expect(requestIdOf(request)).toBe("a1b2c3d4");
  expect(clientAddressOf(request)).toBe("192.0.2.7");
  expect(clientAddressOf(new Request("http://localhost/"))).toBe("unknown");
});
