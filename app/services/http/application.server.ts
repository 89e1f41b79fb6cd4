import compression from "compression";
import express, { type ErrorRequestHandler, type Express, type RequestHandler } from "express";
import type { Logger } from "../log.server";
import { REQUEST_ID_HEADER } from "../request-facts.server";
import { accessLog } from "./access-log.server";
import { guardRequest } from "./guard-request.server";
import { healthRoutes, type Readiness } from "./health.server";
import { identifyRequest } from "./identify-request.server";
import { defaultHeaders } from "./response-headers.server";
import { staticFiles } from "./static-files.server";

export interface ApplicationParts {
  /** The routes of the product. */
  routes: RequestHandler;
  readiness: Readiness;
  logger: Logger;
  clientDirectory: string;
  uploadLimitBytes: number;
  /** Whether browsers reach the application by https. */
  secure: boolean;
  trustProxy: number;
}

/** Everything that a request passes, in order. */
export function createApplication(parts: ApplicationParts): Express {
  const application = express();
  application.disable("x-powered-by");
  application.set("trust proxy", parts.trustProxy);
  application.use(identifyRequest);
  application.use(accessLog(parts.logger));
  application.use(defaultHeaders(parts.secure));
  application.use(healthRoutes(parts.readiness));
  application.use(guardRequest(parts.uploadLimitBytes));
  application.use(compression());
  application.use(staticFiles(parts.clientDirectory));
  application.use(parts.routes);
  application.use(answerUnexpectedError(parts.logger));
  return application;
}

/** Express tells an error handler by its four parameters. */
function answerUnexpectedError(logger: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, _next) => {
    const requestId = String(request.headers[REQUEST_ID_HEADER]);
    logger.error({ requestId, err: error }, "a request failed unexpectedly");
    if (response.headersSent) {
      response.destroy();
      return;
    }
    response
      .status(500)
      .type("text/plain")
      .send(`Something went wrong on our side, and it has been recorded. If it happens again, quote ${requestId}.\n`);
  };
}
