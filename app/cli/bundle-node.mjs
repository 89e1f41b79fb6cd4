/**
 * Bundles what runs in Node beside the React Router build: the server's entry and, since that build does not bundle
 * worker threads, the worker that computes estimates. Packages stay outside the bundles.
 */
import { existsSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

const root = fileURLToPath(new URL("../..", import.meta.url));

const bundles = [
  { from: "app/server.ts", to: "build/start.mjs" },
  { from: "app/estimates/estimate-worker.ts", to: "build/worker/estimate-worker.mjs" },
].filter(({ from }) => existsSync(`${root}/${from}`));

await Promise.all(
  bundles.map(({ from, to }) =>
    build({
      absWorkingDir: root,
      entryPoints: [from],
      outfile: to,
      bundle: true,
      platform: "node",
      format: "esm",
      target: "node20",
      packages: "external",
      alias: { "~": `${root}/app` },
      sourcemap: true,
      logLevel: "warning",
    }),
  ),
);
