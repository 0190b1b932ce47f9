// Makes a fresh clone ready to run: installs the locked dependencies unless they are already there, then builds.
import { spawnSync } from "node:child_process";
import { existsSync, statSync } from "node:fs";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../../", import.meta.url));
const installed = `${root}node_modules/.package-lock.json`;
const locked = `${root}package-lock.json`;

if (!existsSync(installed) || statSync(installed).mtimeMs < statSync(locked).mtimeMs)
  run("npm ci --no-audit --no-fund");
run("node test/config/build.mjs");

function run(command) {
  const { status } = spawnSync(command, { cwd: root, shell: true, stdio: ["ignore", process.stderr, process.stderr] });
  if (status !== 0) process.exit(status ?? 1);
}
