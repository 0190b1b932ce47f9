import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";

/** Plotly as the build makes it. */
export function plotlySource(): string {
  const folder = mkdtempSync(join(tmpdir(), "bulkwright-plotly-"));
  const file = join(folder, "plotly.min.js");
  execFileSync(process.execPath, ["test/config/minifyPlotly.mjs", file]);
  const source = readFileSync(file, "utf8");
  rmSync(folder, { recursive: true });
  return source;
}
