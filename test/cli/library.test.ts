import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, expect, test } from "vitest";
import { runCommand } from "./runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-library-"));
mkdirSync(join(folder, "materials"));
writeFileSync(
  join(folder, "materials", "slag.json"),
  `{ "material": "slag", "title": "Slag", "phases": [ { "phase": "hot\\u001b[2J", "calibratedToGPa": 9,
     "eos": { "form": "table", "file": "slag.csv" }, "source": { "citation": "made up for a test" } } ] }`,
);
writeFileSync(join(folder, "materials", "slag.csv"), "pressure_gpa,density_kg_m3\n0,4000\n50,5000\n100,6000\n");
afterAll(() => rmSync(folder, { recursive: true }));

test("list names shipped compositions and materials, and those of a folder", async () => {
  const { code, out } = await runCommand(["library", "list", "--library", folder]);
  expect(code).toBe(0);
  for (const name of ["earth-like", "iron", "water", "slag"]) expect(out).toMatch(new RegExp(`^  ${name} `, "m"));
});

test("show gives layers, forms, ranges, densities at 0, 100 and 1000 GPa, and sources", async () => {
  const { code, out } = await runCommand(["library", "show", "iron-rich"]);
  expect(code).toBe(0);
  expect(out).toContain("layer 1 from the centre");
  expect(out).toMatch(/phase \w+: birch-murnaghan, densityZeroKgM3 \d/);
  expect(out).toMatch(/data to \d+ GPa/);
  for (const pressure of [0, 100, 1000]) expect(out).toMatch(new RegExp(`density at ${pressure} GPa: \\d+.* kg/m3`));
  expect(out).toMatch(/source: .*doi:10\./);
});

test("show reads a table of the user's, says where it ends, and lets no control character through", async () => {
  const { code, out } = await runCommand(["library", "show", "slag", "--library", folder]);
  expect(code).toBe(0);
  expect(out).toContain("density at 1000 GPa: none, outside the form's range");
  expect(out).toContain("hot\\u001b[2J");
});

test("check finds nothing wrong with a good folder", async () => {
  const { code, out } = await runCommand(["library", "check", folder]);
  expect(code).toBe(0);
  expect(out).toContain("No problem found");
});

test("show of an unknown name ends with 1 and the nearest", async () => {
  const { code, err } = await runCommand(["library", "show", "earthlike"]);
  expect(code).toBe(1);
  expect(err).toContain('Did you mean "earth-like"?');
});
