import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterAll, describe, expect, test } from "vitest";
import { runCommand } from "./runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-bad-"));
afterAll(() => rmSync(folder, { recursive: true }));

const header = "name,mass_earth,mass_earth_minus,mass_earth_plus,radius_earth,radius_earth_minus,radius_earth_plus\n";
const good = "Invented b,5,0.5,0.5,1.6,0.1,0.1\n";

function file(name: string, text: string): string {
  const path = join(folder, name);
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, text);
  return path;
}

const readRows = (csv: string) =>
  parse<Record<string, string>, Record<string, string>>(csv, { columns: true, comment: "#" });

describe("a list that cannot be used ends with 1, says what was found and needed, and prints nothing", () => {
  test.each([
    ["an empty list", file("empty.csv", ""), /empty/],
    [
      "a list without mass or radius",
      file("columns.csv", "planet,colour\nInvented b,red\n"),
      /planet, colour.*mass_earth/s,
    ],
    ["a list that is not there", join(folder, "nowhere.csv"), /nowhere\.csv: it does not exist/],
    ["a folder", folder, /it is a folder/],
  ])("%s", async (_, path, message) => {
    const { code, out, err } = await runCommand(["classify", path]);
    expect({ code, out }).toEqual({ code: 1, out: "" });
    expect(err).toMatch(message);
  });
});

describe("bad rows are results with their reasons, beside the good ones", () => {
  test("text in a number, a negative mass, a radius of zero, missing cells", async () => {
    const bad = [
      "Invented c,about 5,0.5,0.5,1.6,0.1,0.1\n",
      "Invented d,-5,0.5,0.5,1.6,0.1,0.1\n",
      "Invented e,5,0.5,0.5,0,,\n",
      "Invented f,5,0.5,0.5\n",
    ];
    const { code, out } = await runCommand(["classify", "-"], { stdin: header + bad.join("") + good });
    expect(code).toBe(0);
    const rows = readRows(out);
    expect(rows.map(({ name, reasons }) => `${name}: ${reasons}`)).toEqual([
      "Invented c: mass-missing;not-a-number",
      "Invented d: mass-missing;negative-mass",
      "Invented e: radius-missing;zero-radius",
      "Invented f: radius-missing;ragged-row",
      "Invented b: ",
    ]);
    expect(rows.map(({ verdict }) => verdict !== "")).toEqual([false, false, false, false, true]);
  });

  test("100 000 rows in, 100 000 rows out, in order", async () => {
    const list = Array.from({ length: 1e5 }, (_, i) => `Invented ${i},,,,1.6,0.1,0.1\n`);
    const { code, out } = await runCommand(["classify", "-"], { stdin: header + list.join("") });
    expect(code).toBe(0);
    const names = readRows(out).map(({ name }) => name);
    expect(names).toHaveLength(1e5);
    expect(names[77_777]).toBe("Invented 77777");
  });
});

describe("a library that cannot be used ends with 1 and says where", () => {
  const material = (extra: string) =>
    `{ "material": "slag", "title": "Slag", "phases": [ { "phase": "one", ${extra}
       "eos": { "form": "constant", "densityKgM3": 4000 }, "source": { "citation": "made up for a test" } } ] }`;
  const composition = (name: string, layer: string) =>
    `{ "composition": "${name}", "title": "${name}", "layers": [ { ${layer}, "massFraction": 1 } ] }`;

  test("a misspelt key, with file, key path and the nearest known key", async () => {
    const path = file("typo/materials/slag.json", material('"calibratedToGpa": 10,'));
    const { code, err } = await runCommand(["library", "check", join(folder, "typo")]);
    expect(code).toBe(1);
    expect(err).toContain(`${path}: phases[0]`);
    expect(err).toContain('Did you mean "calibratedToGPa"?');
    expect((await runCommand(["curve", "slag", "--library", join(folder, "typo")])).code).toBe(1);
  });

  test("compositions that refer to each other, with the path", async () => {
    file("cycle/one.json", composition("one", '"composition": "two"'));
    file("cycle/two.json", composition("two", '"composition": "one"'));
    const { code, err } = await runCommand(["curve", "one", "--library", join(folder, "cycle")]);
    expect(code).toBe(1);
    expect(err).toContain("one → two → one");
  });

  test("text that is not JSON, with line and column", async () => {
    const path = file("syntax/broken.json", '{\n  "composition": one }');
    const { code, err } = await runCommand(["library", "check", join(folder, "syntax")]);
    expect(code).toBe(1);
    expect(err).toContain(`${path}:2:18`);
  });

  test.each([
    ["a folder that is not there", join(folder, "nowhere"), "it does not exist"],
    ["a folder without files", dirname(file("bare/readme.txt", "")), "holds no .json files"],
  ])("%s", async (_, path, message) => {
    const { code, err } = await runCommand(["library", "list", "--library", path]);
    expect(code).toBe(1);
    expect(err).toContain(message);
  });

  test("a file of the user's wins over a shipped one, and the output says so", async () => {
    file("own/iron.json", composition("iron", '"material": "slag"'));
    file("own/materials/slag.json", material('"calibratedToGPa": 10,'));
    const { code, out, err } = await runCommand(["curve", "iron", "--masses", "1", "--library", join(folder, "own")]);
    expect(code).toBe(0);
    expect(out).toMatch(/^# note: composition "iron": .*own\/iron\.json takes the place of/m);
    expect(err).toContain("takes the place of");
    expect(Number(readRows(out)[0].bulk_density_kg_m3)).toBe(4000);
  });
});

describe("a destination that cannot be used ends with 1 before any work", () => {
  test("the list itself, which stays as it was", async () => {
    const list = file("list.csv", header + good);
    const { code, err } = await runCommand(["classify", list, "--out", list]);
    expect(code).toBe(1);
    expect(err).toContain("inputs are never overwritten");
    expect(readFileSync(list, "utf8")).toBe(header + good);
  });

  test("a file of the library", async () => {
    const own = file("kept/iron.json", '{ "composition": "iron", "title": "x", "layers": [] }');
    const args = ["curve", "earth-like", "--library", join(folder, "kept"), "--out", own];
    expect((await runCommand(args)).err).toContain("inputs are never overwritten");
  });

  test.each([
    ["a folder that is not there", join(folder, "no", "out.csv"), "does not exist"],
    ["a folder in place of a file", folder, "it is a folder"],
  ])("%s", async (_, path, message) => {
    const { code, err } = await runCommand(["curve", "earth-like", "--masses", "1", "--out", path]);
    expect(code).toBe(1);
    expect(err).toContain(message);
  });
});
