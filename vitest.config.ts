import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const alias = { "~": fileURLToPath(new URL("./app", import.meta.url)) };

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: "unit",
          include: ["app/**/*.test.ts", "app/**/*.test.tsx", "tests/{published,figures,structure}/**/*.test.ts"],
          setupFiles: ["tests/setup/quiet-console.ts"],
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: "server",
          include: ["tests/{access,routes,hostile,database}/**/*.test.ts"],
          globalSetup: ["tests/setup/server-build.ts"],
          setupFiles: ["tests/setup/quiet-console.ts"],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: "journeys",
          include: ["tests/journeys/**/*.test.ts"],
          globalSetup: ["tests/setup/server-build.ts"],
          testTimeout: 300_000,
          hookTimeout: 180_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
