import { defineConfig } from "vitest/config";

export default defineConfig({
  test: {
    include: ["tests/**/*.test.ts"],
    testTimeout: 30_000,
    coverage: {
      provider: "v8",
      include: ["src/chemistry/**/*.ts", "src/blending/**/*.ts", "src/cells/**/*.ts"],
      thresholds: { branches: 95 },
    },
  },
});
