import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { expectClose } from "../support/expectClose.ts";
import { type Outcome, runCommand } from "./runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-precision-"));
const library = join(folder, "mine");
mkdirSync(library);
const wet = {
  composition: "wet",
  title: "A quarter of water on an Earth-like interior",
  layers: [
    { composition: "earth-like", massFraction: 0.75 },
    { material: "water-ice-vii", massFraction: 0.25 },
  ],
};
writeFileSync(join(library, "wet.json"), JSON.stringify(wet));
afterAll(() => rmSync(folder, { recursive: true }));

const readRows = (csv: string) =>
  parse<Record<string, string>, Record<string, string>>(csv, { columns: true, comment: "#" });

describe("precision for one planet", () => {
  const page = join(folder, "page.html");
  let outcome: Outcome;
  let rows: Record<string, string>[];
  beforeAll(async () => {
    const planet = ["--mass-earth", "5,0.5", "--radius-earth", "1.6,0.05"];
    const map = ["--html", page, "--mass-errors-percent", "20,1,5", "--radius-errors-percent", "1:16:5"];
    outcome = await runCommand(["precision", ...planet, "--between", "silicate,earth-like", "--sigma", "2,3", ...map]);
    rows = readRows(outcome.out);
  });

  test("lists today's errors, halved ones, and those that reach each level", () => {
    expect({ code: outcome.code, err: outcome.err }).toEqual({ code: 0, err: "" });
    expect(rows.map(({ step, wanted_sigma }) => [step, Number(wanted_sigma)])).toEqual([
      ["now", 0],
      ["halve-mass", 0],
      ["halve-radius", 0],
      ["halve-both", 0],
      ["mass-alone", 2],
      ["radius-alone", 2],
      ["both", 2],
      ["mass-alone", 3],
      ["radius-alone", 3],
      ["both", 3],
    ]);
    expect(rows.slice(0, 4).map((row) => [row.mass_error_percent, row.radius_error_percent].map(Number))).toEqual([
      [10, 3.125],
      [5, 3.125],
      [10, 1.5625],
      [5, 1.5625],
    ]);
  });

  test("reaches what it says, by the nonlinear separation too", () => {
    for (const row of rows.filter(({ wanted_sigma, separation_sigma }) => wanted_sigma && separation_sigma)) {
      expectClose(Number(row.separation_sigma), Number(row.wanted_sigma), { rel: 1e-10, because: "12 digits" });
      const because = "the mass error is 10 %, within which the curves bend a little";
      expectClose(Number(row.separation_sigma_nonlinear), Number(row.wanted_sigma), { rel: 0.03, because });
    }
  });

  test("says which error limits, and what cannot be reached by one alone", () => {
    expect(rows[0].statement).toBe("silicate and earth-like differ by 2.0 sigma, limited by the radius error");
    expect(rows[2].limiting_error).toBe("mass");
    expect(rows[7].statement).toMatch(/^cannot be reached by improving the mass alone: the radius error allows 2\.6/);
    expect(rows[7].mass_error_percent).toBe("");
  });

  test("expects smaller errors to narrow the interval and to add information", () => {
    const [now, mass, radius, both] = rows.map((row) => Number(row.core_mass_fraction_width68));
    expect(Math.max(mass, radius)).toBeLessThan(now);
    expect(both).toBeLessThan(Math.min(mass, radius));
    expect(Number(rows[0].information_bit)).toBe(0);
    expect(Number(rows[3].information_bit)).toBeGreaterThan(Number(rows[1].information_bit));
  });

  test("gives the formula, the sources and where the planet lies", () => {
    expect(outcome.out).toContain("# note: separation_sigma = |R_A(M) - R_B(M)| / sqrt(");
    expect(outcome.out).toMatch(
      /# note: the measured radius is \d\.\d sigma from silicate and \d\.\d sigma from earth/,
    );
    expect(outcome.out).toContain("# source: iron-birch-2025");
  });

  test("writes a page with the map's numbers and the steps", () => {
    const html = readFileSync(page, "utf8");
    for (const text of ["Radius 16 %", "halve-both", "Contour map", "2 sigma"]) expect(html).toContain(text);
  });
});

describe("precision for a planet half known", () => {
  test("takes the mass from the first composition, and says so", async () => {
    const args = ["precision", "--radius-earth", "1.6,0.05", "--between", "earth-like,water", "--sigma", "3"];
    const { code, out } = await runCommand([...args, "--proportion", "2"]);
    expect(code).toBe(0);
    expect(out).toContain("# note: the mass is not given: that of earth-like is used, without an error");
    const rows = readRows(out);
    expect(rows.map(({ step }) => step)).toEqual(["now", "mass-alone", "radius-alone", "both"]);
    expect(rows[0].statement).toBe("says nothing yet: the mass is not measured");
    expect(Number(rows[1].mass_error_percent)).toBeGreaterThan(5);
    expect(rows[2].statement).toContain("the mass is not measured");
    const ratio = Number(rows[3].mass_error_percent) / Number(rows[3].radius_error_percent);
    expectClose(ratio, 2, { rel: 1e-10, because: "12 digits" });
  });
});

describe("degeneracy", () => {
  test("is named where errors of 5 % leave less than 1 sigma", async () => {
    const planet = ["--mass-earth", "5,0.25", "--radius-earth", "1.75,0.0875"];
    const { out } = await runCommand(["precision", ...planet, "--between", "silicate,wet", "--library", library]);
    const [now] = readRows(out);
    expect(Number(now.separation_sigma)).toBeLessThan(1);
    expect(now.statement).toBe(
      "degenerate: silicate and wet differ by 0.8 sigma only, so these errors do not tell them apart",
    );
    expect(out).toContain(`# note: ${now.statement}`);
  });
});

describe("precision for a list", () => {
  const list = `\
name,mass_earth,mass_earth_minus,mass_earth_plus,radius_earth,radius_earth_minus,radius_earth_plus,host
"Invented #1, b",4.7,0.1,0.1,1.61,0.01,0.01,One
<b>Invented</b> c,2.1,0.5,0.5,1.22,0.02,0.02,Two
Invented d,,,,1.38,0.05,0.05,Three
`;

  test("ranks by what one more measurement would teach; refused rows keep their reasons", async () => {
    const args = ["precision", "-", "--between", "silicate,earth-like", "--sigma", "2.5", "--keep", "host"];
    const { code, out } = await runCommand(args, { stdin: list });
    expect(code).toBe(0);
    const rows = readRows(out);
    expect(rows.map(({ rank, name, halve, reasons, host }) => [rank, name, halve, reasons, host])).toEqual([
      ["1", "<b>Invented</b> c", "mass", "", "Two"],
      ["2", "Invented #1, b", "radius", "", "One"],
      ["", "Invented d", "", "mass-missing", "Three"],
    ]);
    const [first] = rows;
    const gain = Number(first.core_mass_fraction_width68) - Number(first.core_mass_fraction_width68_halve_mass);
    expectClose(Number(first.core_mass_fraction_width68_reduction), gain, { rel: 1e-8, because: "12 digits" });
    expect(Number(first["mass_error_percent_for_2.5_sigma"])).toBeGreaterThan(0);
  });

  test("ranks by the error and the family asked for", async () => {
    const args = ["precision", "-", "--between", "silicate,water", "--halve", "both", "--family", "earth-like-water"];
    const { out } = await runCommand([...args, "--format", "json"], { stdin: list });
    const { rows } = JSON.parse(out);
    expect(rows.map(({ halve }: { halve: string }) => halve)).toEqual(["both", "both", null]);
    expect(rows[0].water_mass_fraction_width68_reduction).toBeGreaterThan(
      rows[1].water_mass_fraction_width68_reduction,
    );
  });
});

describe("what precision cannot use", () => {
  test("an unknown composition and a mass without models end with 1", async () => {
    const planet = ["--mass-earth", "5,0.5", "--radius-earth", "1.6,0.1"];
    expect(await runCommand(["precision", ...planet, "--between", "silicate,nothing"])).toMatchObject({
      code: 1,
      out: "",
    });
    const heavy = await runCommand(["precision", "--mass-earth", "5000,1", "--between", "silicate,iron"]);
    expect(heavy).toMatchObject({ code: 1, out: "" });
    expect(heavy.err).toMatch(/5000 Earth masses is outside/);
  });
});
