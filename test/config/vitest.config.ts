import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

// biome-ignore lint/style/noDefaultExport: vitest reads its configuration from the default export
export default defineConfig({
  root: fileURLToPath(new URL("../../", import.meta.url)),
  test: {
    include: ["test/**/*.test.ts"],
    allowOnly: false,
    // Only to end what hangs: the machine may be busy.
    testTimeout: 180_000,
    hookTimeout: 180_000,
  },
});
