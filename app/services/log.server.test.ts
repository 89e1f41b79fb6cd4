import { describe, expect, it } from "vitest";
import { createLogger } from "./log.server";

function capture() {
  const lines: string[] = [];
  const logger = createLogger("debug", { write: (line) => void lines.push(line) });
  return { logger, lines };
}

describe("createLogger", () => {
  it("writes one JSON object a line, with level, UTC time and the request's id", () => {
    const { logger, lines } = capture();
    logger.child({ requestId: "abcdefgh-1" }).info({ rows: 3 }, "stored");
    expect(lines).toHaveLength(1);
    const line: Record<string, unknown> = JSON.parse(lines[0]);
    expect(line).toMatchObject({ level: "info", requestId: "abcdefgh-1", rows: 3, msg: "stored" });
    expect(line.time).toMatch(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/);
  });

  it("leaves secrets out, wherever they stand", () => {
    const { logger, lines } = capture();
    logger.info(
      {
        password: "s3cret-a",
        form: { passcode: "s3cret-b", newPassword: "s3cret-c" },
        request: { headers: { cookie: "s3cret-d", authorization: "s3cret-e", "set-cookie": "s3cret-f" } },
        a: { b: { c: { token: "s3cret-g" } } },
      },
      "sign-in",
    );
    expect(lines[0]).not.toContain("s3cret");
    expect(lines[0].match(/\[left out\]/g)).toHaveLength(7);
  });

  it("cannot be made to write a line that was not logged", () => {
    const { logger, lines } = capture();
    logger.info({ name: 'x"}\n{"level":"fatal","msg":"forged"}' }, "a name\r\nwith breaks\u2028");
    expect(lines).toHaveLength(1);
    expect(lines[0].trimEnd()).not.toMatch(/[\r\n]/);
    expect(JSON.parse(lines[0]).level).toBe("info");
  });

  it("tells an error and its cause, but not the statement and the values of a database error", () => {
    const { logger, lines } = capture();
    const cause = Object.assign(new Error("UNIQUE constraint failed"), { code: "SQLITE_CONSTRAINT" });
    const error = Object.assign(new Error("could not store", { cause }), {
      sql: "INSERT INTO users VALUES ('ana@example.com')",
      parameters: ["ana@example.com"],
    });
    logger.error({ err: error }, "failed");
    expect(JSON.parse(lines[0]).err).toMatchObject({
      message: "could not store",
      cause: { message: "UNIQUE constraint failed", code: "SQLITE_CONSTRAINT" },
    });
    expect(lines[0]).not.toContain("ana@example.com");
  });
});
