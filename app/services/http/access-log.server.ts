import type { RequestHandler } from "express";
import type { Logger } from "../log.server";
import { REQUEST_ID_HEADER } from "../request-facts.server";
import { logPath } from "./log-path.server";

/** One line for each request, written when its response is over, also when the client went away before. */
export function accessLog(logger: Logger): RequestHandler {
  return (request, response, next) => {
    const startedAt = performance.now();
    response.once("close", () => {
      const line = {
        requestId: request.headers[REQUEST_ID_HEADER],
        method: request.method,
        path: logPath(request.originalUrl),
        status: response.statusCode,
        durationMs: Math.round((performance.now() - startedAt) * 10) / 10,
        address: request.ip,
        ...(response.writableFinished ? {} : { aborted: true }),
      };
      if (response.statusCode >= 500) logger.error(line, "request");
      else if (isProbe(request.path)) logger.debug(line, "request");
      else logger.info(line, "request");
    });
    next();
  };
}

function isProbe(path: string): boolean {
  return path === "/healthz" || path === "/readyz";
}
