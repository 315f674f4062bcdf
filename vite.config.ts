import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

const apiPort = process.env.GLASSBYRE_DEV_API_PORT ?? "4100";

export default defineConfig({
  plugins: [react(), tailwindcss()],
  build: { outDir: "dist", sourcemap: false, manifest: true, chunkSizeWarningLimit: 600 },
  server: {
    proxy: { "/api": `http://127.0.0.1:${apiPort}`, "/auth": `http://127.0.0.1:${apiPort}` },
  },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          include: ["tests/engine/**/*.test.ts", "tests/unit/**/*.test.ts", "tests/validation/**/*.test.ts"],
          environment: "node",
          setupFiles: ["tests/support/property-seed.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "component",
          include: ["tests/components/**/*.test.tsx"],
          environment: "happy-dom",
          setupFiles: ["tests/support/component-setup.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "api",
          include: ["tests/api/**/*.test.ts"],
          environment: "node",
          fileParallelism: false,
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: "browser",
          include: ["tests/browser/**/*.test.ts"],
          environment: "node",
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 180_000,
        },
      },
    ],
  },
});
