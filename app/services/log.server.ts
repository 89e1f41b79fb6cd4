import pino from "pino";
import { config } from "./config.server";

export type Logger = pino.Logger;

/** Fields that never reach a log, at the top of a line and up to three objects down. */
const SECRET_FIELDS = [
  "password",
  "newPassword",
  "currentPassword",
  "passwordHash",
  "passcode",
  "token",
  "tokenHash",
  "secret",
  "apiKey",
  "session",
  "sessionId",
  "cookie",
  '["set-cookie"]',
  "authorization",
];

const SECRET_PATHS = SECRET_FIELDS.flatMap((field) =>
  ["", "*", "*.*", "*.*.*"].map((above) =>
    field.startsWith("[") || above === "" ? above + field : `${above}.${field}`,
  ),
);

interface LoggedError {
  type: string;
  message: string;
  code?: unknown;
  stack?: string;
  cause?: LoggedError;
}

/** Only what explains an error: a database error also carries its statement with everyone's values in it. */
function describeError(error: unknown): LoggedError {
  if (!(error instanceof Error)) return { type: typeof error, message: String(error) };
  return {
    type: error.name,
    message: error.message,
    ...("code" in error ? { code: error.code } : {}),
    stack: error.stack,
    ...(error.cause === undefined ? {} : { cause: describeError(error.cause) }),
  };
}

/**
 * A logger that writes one JSON object a line; line breaks inside a value are escaped, so no input can forge a line.
 * @param destination where the lines go; standard error by default, since standard output belongs to a command's answer
 */
export function createLogger(
  level: pino.LevelWithSilent,
  destination: pino.DestinationStream = pino.destination({ fd: 2, sync: true }),
): Logger {
  return pino(
    {
      level,
      base: undefined,
      timestamp: pino.stdTimeFunctions.isoTime,
      formatters: { level: (label) => ({ level: label }) },
      redact: { paths: SECRET_PATHS, censor: "[left out]" },
      serializers: { err: describeError, error: describeError },
    },
    destination,
  );
}

let processLogger: Logger | undefined;

/** The logger of this process. */
export function log(): Logger {
  processLogger ??= createLogger(config().logLevel);
  return processLogger;
}

/** A logger whose every line carries the request's id. */
export function requestLog(requestId: string): Logger {
  return log().child({ requestId });
}
