import { spawn, spawnSync } from "node:child_process";
import { once } from "node:events";
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { afterAll, expect, test } from "vitest";

// The few things only the built command shows. `npm test` builds it first.
const main = "dist/cli/main.js";
const folder = mkdtempSync(join(tmpdir(), "bulkwright-main-"));
afterAll(() => rmSync(folder, { recursive: true }));

test("a closed pipe ends quietly", () => {
  const pipeline = `set -o pipefail; node ${main} curve earth-like --masses 0.1:20:5000 | head -n 1`;
  const { status, stdout, stderr } = spawnSync("bash", ["-c", pipeline], { encoding: "utf8" });
  expect({ status, stderr }).toEqual({ status: 0, stderr: "" });
  expect(stdout).toMatch(/^# bulkwright: /);
});

test("exit codes reach the shell", () => {
  expect(spawnSync(process.execPath, [main, "--version"]).status).toBe(0);
  expect(spawnSync(process.execPath, [main, "curve", "no-such-thing"]).status).toBe(1);
  expect(spawnSync(process.execPath, [main, "no-such-command"]).status).toBe(2);
});

test("the built command writes files", () => {
  const out = join(folder, "curve.csv");
  expect(spawnSync(process.execPath, [main, "curve", "iron", "--masses", "1", "--out", out]).status).toBe(0);
  expect(readFileSync(out, "utf8")).toContain("iron,1.00000000000,");
  rmSync(out);
});

test("Ctrl-C during a run ends with 130 and leaves no output", async () => {
  const out = join(folder, "out.csv");
  const child = spawn(process.execPath, [main, "classify", "-", "--out", out], { stdio: ["pipe", "ignore", "ignore"] });
  const row = "Invented b,5,0.5,0.5,1.6,0.1,0.1\n";
  child.stdin.end(
    `name,mass_earth,mass_earth_minus,mass_earth_plus,radius_earth,radius_earth_minus,radius_earth_plus\n${row.repeat(1e5)}`,
  );
  // Far more than a pipe holds: once all of it is taken, the run is under way.
  await once(child.stdin, "finish");
  child.kill("SIGINT");
  const [code] = await once(child, "exit");
  expect(code).toBe(130);
  expect(existsSync(out)).toBe(false);
  expect(readdirSync(folder)).toEqual([]);
});

test("start-up reads the option parser and little else", () => {
  const loaded = staticImports("dist/cli/main.js");
  const bytes = [...loaded].map((file) => statSync(file).size).reduce((sum, size) => sum + size, 0);
  expect(bytes).toBeLessThan(60_000);
});

/** The files Node reads before the first line runs. */
function staticImports(file: string, seen = new Set<string>()): Set<string> {
  if (seen.has(file)) return seen;
  seen.add(file);
  for (const [, path] of readFileSync(file, "utf8").matchAll(/\bimport\s*(?:[^"'()]*?from\s*)?"(\.[^"]+)"/g)) {
    staticImports(join(dirname(file), path), seen);
  }
  return seen;
}
