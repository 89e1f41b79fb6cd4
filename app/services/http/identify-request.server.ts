import type { RequestHandler } from "express";
import { chooseRequestId, CLIENT_ADDRESS_HEADER, REQUEST_ID_HEADER } from "../request-facts.server";

/** Gives the request its id and the client's address, and tells the client the id. */
export const identifyRequest: RequestHandler = (request, response, next) => {
  const id = chooseRequestId(request.get(REQUEST_ID_HEADER));
  request.headers[REQUEST_ID_HEADER] = id;
  request.headers[CLIENT_ADDRESS_HEADER] = request.ip ?? "unknown";
  response.setHeader(REQUEST_ID_HEADER, id);
  next();
};
