import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { expectClose } from "../support/expectClose.ts";
import { type Outcome, runCommand } from "./runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-classify-"));
afterAll(() => rmSync(folder, { recursive: true }));

const leadingColumns =
  "name,verdict,reasons,mass_earth,radius_earth,p_denser_than_iron,p_iron_silicate,p_silicate_water,p_lighter_than_water,core_mass_fraction,core_mass_fraction_minus,core_mass_fraction_plus,water_mass_fraction,water_mass_fraction_minus,water_mass_fraction_plus";

const list = `\
name,mass_earth,mass_earth_minus,mass_earth_plus,radius_earth,radius_earth_minus,radius_earth_plus,host,reasons
"Invented #1, b",1.02,0.06,0.06,0.99,0.02,0.02,"=HYPERLINK(""x"")",mine
<b>Invented</b> c,6.4,0.5,0.5,1.97,0.04,0.04,Two,
Invented d,,,,1.38,0.05,0.05,Three,
Invented e,6.6,0.6,0.6,,,,Four,
Invented f,5,,,1.7,,,Five,
`;

describe("classify", () => {
  const page = join(folder, "page.html");
  let outcome: Outcome;
  let rows: Record<string, string>[];
  beforeAll(async () => {
    const args = ["--earth-radius-km", "mean", "classify", "-", "--keep", "host,reasons", "--html", page];
    outcome = await runCommand(args, { stdin: list });
    rows = parse<Record<string, string>, Record<string, string>>(outcome.out, { columns: true, comment: "#" });
  });

  test("gives one row for each, names verbatim, exactly one of verdict and reasons", () => {
    expect(outcome.code).toBe(0);
    expect(outcome.out.split("\n").find((line) => !line.startsWith("# "))).toMatch(new RegExp(`^${leadingColumns},`));
    expect(rows.map(({ name }) => name)).toEqual([
      "Invented #1, b",
      "<b>Invented</b> c",
      "Invented d",
      "Invented e",
      "Invented f",
    ]);
    expect(rows.map(({ verdict }) => verdict)).toEqual(["iron-silicate", "silicate-water", "", "", ""]);
    expect(rows.map(({ reasons }) => reasons)).toEqual([
      "",
      "",
      "mass-missing",
      "radius-missing",
      "mass-error-missing;radius-error-missing",
    ]);
  });

  test("the four probabilities sum to 1", () => {
    for (const row of rows.slice(0, 2)) {
      const sum = Object.entries(row).reduce((total, [key, value]) => total + (/^p_/.test(key) ? Number(value) : 0), 0);
      expectClose(sum, 1, { rel: 1e-11, because: "12 digits are printed" });
    }
  });

  test("a radius alone is told the masses allowed, a mass alone the radii", () => {
    const [, , noMass, noRadius] = rows;
    expect(Number(noMass.mass_earth_if_iron)).toBeGreaterThan(Number(noMass.mass_earth_if_silicate));
    expect(Number(noRadius.radius_earth_if_silicate)).toBeGreaterThan(Number(noRadius.radius_earth_if_iron));
    expect(noMass.radius_earth_if_iron + noRadius.mass_earth_if_iron).toBe("");
  });

  test("columns to keep are verbatim, one with a name of ours under another", () => {
    expect(rows.map(({ host }) => host)).toEqual(['=HYPERLINK("x")', "Two", "Three", "Four", "Five"]);
    expect(rows[0].reasons_in_list).toBe("mine");
  });

  test("measured values come back in the units they were given in, with another Earth radius too", () => {
    expect(rows.map(({ radius_earth }) => Number(radius_earth))).toEqual([0.99, 1.97, 1.38, 0, 1.7]);
    expect(outcome.out).toContain("# unit: Earth radius 6371 km");
  });

  test("the page names every planet and the curves, and no name is markup", () => {
    const html = readFileSync(page, "utf8");
    for (const text of ["Invented #1, b", "Invented f", "Pure iron", "Earth-like"]) expect(html).toContain(text);
    expect(html).not.toContain("<b>Invented");
  });
});

test("one planet by options", async () => {
  const args = ["classify", "--mass-earth", "4.7,0.2", "--radius-earth", "2.6,0.05,0.04"];
  const { code, out } = await runCommand([...args, "--format", "json"]);
  const { provenance, rows } = JSON.parse(out);
  expect(code).toBe(0);
  expect(provenance.command).toBe(`bulkwright ${args.join(" ")} --format json`);
  expect(rows).toHaveLength(1);
  expect(rows[0]).toMatchObject({ verdict: "lighter-than-water", reasons: null, mass_earth: 4.7, radius_earth: 2.6 });
});

test.each([
  ["a column to keep that is not there", ["classify", "-", "--keep", "hots"], 'Did you mean "host"?', 1],
  ["curves in the wrong order", ["classify", "-", "--compositions", "water,silicate,iron"], "not larger than", 1],
  ["two curves", ["classify", "-", "--compositions", "iron,water"], "three compositions", 2],
  ["a column choice without =", ["classify", "-", "--column", "mass"], "NAME=VALUE", 2],
])("%s is refused", async (_, args, message, expected) => {
  const { code, out, err } = await runCommand(args, { stdin: list });
  expect({ code, out }).toEqual({ code: expected, out: "" });
  expect(err).toContain(message);
});
