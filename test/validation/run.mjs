// Computes the bodies of the Solar System and published relations from the sources, and writes output/validation.html
// and output/validation.csv.
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { build } from "esbuild";

process.chdir(fileURLToPath(new URL("../../", import.meta.url)));
await import("../config/generateShipped.mjs");
const folder = mkdtempSync(join(tmpdir(), "bulkwright-validation-"));
const outfile = join(folder, "validate.mjs");
try {
  await build({
    entryPoints: ["test/validation/validate.ts"],
    bundle: true,
    format: "esm",
    platform: "node",
    target: "node20",
    outfile,
    logLevel: "warning",
  });
  await import(pathToFileURL(outfile).href);
} finally {
  rmSync(folder, { recursive: true });
}
