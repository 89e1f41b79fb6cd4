import { createHash } from "node:crypto";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readStamp, stampOf } from "./stamp";

describe("stampOf", () => {
  it("is the first 40 bits of the SHA-256 in Crockford's base 32", () => {
    // SHA-256 of "abc" starts with ba7816bf8f (FIPS 180-4, example B.1): 10111 01001 11100 00001 01101 01111 11100 01111.
    expect(stampOf("abc")).toBe("GP-Q9W1-DFWF");
  });

  it("agrees with an independent conversion by big integers", () => {
    const digits = "0123456789ABCDEFGHJKMNPQRSTVWXYZ";
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 200 }), (bytes) => {
        let rest = BigInt(`0x${createHash("sha256").update(bytes).digest("hex").slice(0, 10)}`);
        let code = "";
        for (let index = 0; index < 8; index++) {
          code = digits[Number(rest % 32n)] + code;
          rest /= 32n;
        }
        expect(stampOf(bytes)).toBe(`GP-${code.slice(0, 4)}-${code.slice(4)}`);
      }),
    );
  });

  it("uses no letter that is read as another", () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        expect(stampOf(text).slice(3)).not.toMatch(/[ILOU]/);
      }),
    );
  });
});

describe("readStamp", () => {
  it("takes back every stamp, however it was typed", () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const stamp = stampOf(text);
        expect(readStamp(stamp)).toBe(stamp);
        expect(readStamp(` ${stamp.toLowerCase().replaceAll("-", " ")} `)).toBe(stamp);
      }),
    );
  });

  it("mends letters taken for digits", () => {
    expect(readStamp("gp-o1l2-aaaa")).toBe("GP-0112-AAAA");
  });

  it.each(["", "GP", "GP-7K2M", "GP-7K2M-41XQ-1", "GP-7K2M-41XU", "GP-7K2M-41X?"])("refuses %j", (typed) => {
    expect(readStamp(typed)).toBeNull();
  });
});
