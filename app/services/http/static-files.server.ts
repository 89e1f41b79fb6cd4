import path from "node:path";
import express, { Router } from "express";

/**
 * The files of the browser build. Those under /assets carry a hash of their content in the name and never change; the
 * others keep their name and are asked for again after an hour.
 */
export function staticFiles(clientDirectory: string): Router {
  const router = Router();
  router.use(
    "/assets",
    express.static(path.join(clientDirectory, "assets"), {
      immutable: true,
      maxAge: "365d",
      index: false,
      redirect: false,
    }),
    (_request, response) => {
      response.status(404).type("text/plain").send("There is no such file.\n");
    },
  );
  router.use(express.static(clientDirectory, { maxAge: "1h", index: false, redirect: false }));
  return router;
}
