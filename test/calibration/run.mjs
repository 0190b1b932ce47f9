// Simulation-based calibration of all families: `npm run calibrate`, or `npm run calibrate -- 4000` for fewer planets of
// each. Takes minutes. Ends with 1 if a family fails.
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

process.chdir(fileURLToPath(new URL("../../", import.meta.url)));
await import("../config/generateShipped.mjs");
const planets = Number(process.argv[2] ?? 20_000);
const { outputFiles } = await build({
  entryPoints: ["test/calibration/calibrateAll.ts"],
  bundle: true,
  format: "esm",
  platform: "node",
  target: "node20",
  write: false,
  logLevel: "warning",
});
const code = Buffer.from(outputFiles[0].contents).toString("base64");
const { calibrateAll } = await import(`data:text/javascript;base64,${code}`);
const faults = calibrateAll(planets);
for (const fault of faults) console.error(fault);
process.exitCode = faults.length > 0 ? 1 : 0;
