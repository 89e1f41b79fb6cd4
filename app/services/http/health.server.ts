import { Router } from "express";

export type Readiness = () => Promise<{ ready: boolean; reason?: string }>;

/** `/healthz`: the process answers. `/readyz`: it can also do its work. */
export function healthRoutes(readiness: Readiness): Router {
  const router = Router();
  router.get("/healthz", (_request, response) => {
    response.json({ status: "up" });
  });
  router.get("/readyz", async (_request, response) => {
    const { ready, reason } = await readiness();
    response.status(ready ? 200 : 503).json(ready ? { status: "ready" } : { status: "not ready", reason });
  });
  return router;
}
