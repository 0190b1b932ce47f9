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

test("show tells of gas and of other published sets", async () => {
  const { out } = await runCommand(["library", "show", "earth-like-gas-2"]);
  expect(out).toContain("  envelope: massFraction 0.02, opacity solar, fluxEarth 10, ageGyr 5\n");
  expect(out).toContain("  alternatives: iron-birch-2016, iron-vinet-2007, iron-vinet-2018\n");
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

test("--from-abundances writes a planet of the star's iron and rock that curve can use", async () => {
  const mine = join(folder, "from-star");
  const ratios = "Fe/Mg=0.81+-0.04,Si/Mg=0.91+-0.03";
  const { code, out } = await runCommand(["library", "--from-abundances", ratios, "--out", mine, "--name", "tau"]);
  expect(code).toBe(0);
  // Solar ratios give 0.3226 with Mg, Si, Fe and O alone, 0.307 with Al and Ca (Asplund et al. 2021).
  expect(out).toMatch(/^core mass fraction 0\.32\d+ \(68 % between 0\.31\d+ and 0\.33\d+\)$/m);
  expect(out).toMatch(/with Al and Ca 0\.30[67]\d* \(Al and Ca in the Sun's proportion to Mg\)$/m);
  expect(out).toContain(join(mine, "materials", "tau-mantle.json"));
  expect(await runCommand(["library", "check", mine])).toMatchObject({ code: 0 });
  const curve = await runCommand(["curve", "tau", "--library", mine, "--masses", "1"]);
  expect(curve.code).toBe(0);
  expect(curve.out).toMatch(/^tau,1\.00000000000,0\.9/m);
  expect(curve.out).toContain(`abundances as given: ${ratios}`);
});

test("--from-abundances without a folder prints both files, and what they mean beside", async () => {
  const solar = await runCommand(["library", "--from-abundances", "Fe/Mg=0.81,Si/Mg=0.91"]);
  const files = JSON.parse(solar.out);
  expect(Object.keys(files)).toEqual(["star-planet.json", "materials/star-planet-mantle.json"]);
  expect(files["star-planet.json"].layers[0].massFraction).toBeCloseTo(0.3226, 4);
  expect(solar.err).toContain("core mass fraction 0.3226\n");
  const dex = ["library", "--from-abundances", "[Fe/H]=0,[Mg/H]=0,[Si/H]=0"];
  const scaled = await runCommand([...dex, "--solar-scale", "asplund2021", "--mantle-iron-share", "0.1"]);
  expect(scaled.code).toBe(0);
  expect(scaled.err).toMatch(/Fe\/\(Mg \+ Fe\) 0\.07\d+$/m);
});

test.each([
  ["no scale for dex", ["--from-abundances", "[Fe/H]=0,[Mg/H]=0,[Si/H]=0"], 1, "asplund2021"],
  ["a ratio that is none", ["--from-abundances", "Fe/Mg=iron,Si/Mg=1"], 1, "Fe/Mg=iron"],
  ["a scale that is none", ["--from-abundances", "Fe/Mg=1,Si/Mg=1", "--solar-scale", "mine"], 2, "lodders2003"],
  ["all iron in the mantle", ["--from-abundances", "Fe/Mg=1,Si/Mg=1", "--mantle-iron-share", "1"], 2, "below 1"],
  ["a name that is a path", ["--from-abundances", "Fe/Mg=1,Si/Mg=1", "--name", "../x"], 1, "a name is made of"],
  ["an unknown subcommand", ["lst"], 2, 'Did you mean "list"?'],
])("%s is refused", async (_, args, expected, message) => {
  const { code, out, err } = await runCommand(["library", ...args]);
  expect({ code, out }).toEqual({ code: expected, out: "" });
  expect(err).toContain(message);
});
