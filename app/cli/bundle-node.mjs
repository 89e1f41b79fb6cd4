/**
 * Bundles what runs in Node beside the React Router build: the server's entry, the operator's command line (for images
 * without the tools of development) and, since that build does not bundle worker threads, the workers that compute
 * estimates and read HDF5. Packages stay outside the bundles.
 */
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

const root = fileURLToPath(new URL("../..", import.meta.url));

const bundles = [
  { from: "app/server.ts", to: "build/start.mjs" },
  { from: "app/cli/galeprint.ts", to: "build/galeprint.mjs" },
  { from: "app/estimates/estimate-worker.ts", to: "build/worker/estimate-worker.mjs" },
  { from: "app/readers/netcdf/hdf5-worker.ts", to: "build/worker/hdf5-worker.mjs" },
];

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
