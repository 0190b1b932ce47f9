// Builds dist/: the command line (Node, split so that each command loads only its own code), the library (one module
// without Node built-ins, so that it also runs in a web page), its type declarations, Plotly, and the licences of all
// that is bundled. Nothing is left to install beside the package.
import { execFileSync } from "node:child_process";
import { chmodSync, rmSync, writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";
import { licencesOf } from "./licences.mjs";

process.chdir(fileURLToPath(new URL("../../", import.meta.url)));
const node = (...args) => execFileSync(process.execPath, args, { stdio: ["ignore", process.stderr, process.stderr] });

node("test/config/generateShipped.mjs");
for (const stale of ["dist/cli", "dist/types"]) rmSync(stale, { recursive: true, force: true });

const shared = {
  bundle: true,
  format: "esm",
  target: "node20",
  logLevel: "warning",
  legalComments: "none",
  metafile: true,
};

const commandLine = await build({
  ...shared,
  entryPoints: ["src/cli/main.ts"],
  outdir: "dist/cli",
  chunkNames: "parts/[name]-[hash]",
  platform: "node",
  splitting: true,
  minify: true,
  // Some dependencies are CommonJS and expect what Node gives only to that.
  banner: {
    js: 'import{createRequire}from"node:module";const require=createRequire(import.meta.url),__filename=import.meta.filename;',
  },
});
chmodSync("dist/cli/main.js", 0o755);

const library = await build({
  ...shared,
  entryPoints: ["src/index.ts"],
  outfile: "dist/index.js",
  platform: "browser",
  alias: { "csv-parse/sync": "csv-parse/browser/esm/sync" },
});

node("node_modules/typescript/bin/tsc", "-p", "test/config/tsconfig.types.json");
node("test/config/minifyPlotly.mjs");
writeFileSync(
  "dist/THIRD-PARTY-LICENSES.txt",
  licencesOf([commandLine.metafile, library.metafile], ["plotly.js-dist"]),
);
