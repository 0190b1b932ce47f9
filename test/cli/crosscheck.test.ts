import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterAll, describe, expect, test } from "vitest";
import { runCommand } from "./runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-crosscheck-"));
afterAll(() => rmSync(folder, { recursive: true }));

/** Writes a file of the user's and gives its path. */
function file(name: string, text: string): string {
  const path = join(folder, name);
  writeFileSync(path, text);
  return path;
}

const rowsOf = (csv: string) =>
  parse<Record<string, string>, Record<string, string>>(csv, { columns: true, comment: "#", comment_no_infix: true });

const header =
  "name,mass_earth,mass_earth_err,radius_earth,radius_earth_err,period_days,semi_major_axis_au,star_mass_sun";
const hostile = '"=HYPERLINK(""x"") <img src=x onerror=alert(1)>\u001b[31m"';
const faulty = file(
  "faulty.csv",
  `${header}
Invented 1 b,1,0.05,1,0.02,365.25,1,1
${hostile},8,0.5,0.15,0.01,2.9,0.0398,1
"Invented 3, b",5,0.3,1.6,0.05,3.2,0.0715,1
Invented 4 b,5,0,1.6,0.05,10,,1
`,
);
const clean = file("clean.csv", `${header}\nInvented 1 b,1,0.05,1,0.02,365.25,1,1\n`);

describe("one list", () => {
  test("findings are a table with the agreed columns, the summary stands apart", async () => {
    const { code, out, err } = await runCommand(["crosscheck", faulty]);
    expect(code).toBe(0);
    const line = out.split("\n").find((text) => !text.startsWith("# "));
    expect(line).toBe("row,name,rule,severity,quantity,value,expected,significance_sigma,explanation,remedy,line");
    const found = rowsOf(out).map(({ row, line, rule, severity, quantity }) => [row, line, rule, severity, quantity]);
    expect(found).toContainEqual(["2", "3", "denser-than-iron", "error", "radius_earth"]);
    expect(found).toContainEqual(["3", "4", "kepler-third-law", "error", "star_mass_sun"]);
    expect(found).toContainEqual(["4", "5", "zero-uncertainty", "warning", "mass_earth"]);
    expect(found.filter(([row]) => row === "1")).toEqual([]);
    expect(err).toMatch(
      /5 findings in 4 rows\nseverity {2}count {2}rule\nerror .* denser-than-iron\nerror .* kepler-third-law\nwarn/,
    );
  });

  test("the iron that nothing is denser than is the solver's", async () => {
    const [finding] = rowsOf((await runCommand(["crosscheck", faulty, "--rules", "denser-than-iron"])).out);
    const curve = rowsOf((await runCommand(["curve", "iron", "--masses", "8"])).out);
    expect(Number(finding.expected) / Number(curve[0].radius_earth)).toBeCloseTo(1, 5);
  });

  test("--out takes CSV or JSON from the extension; the summary then is on standard output", async () => {
    const json = join(folder, "findings.json");
    const { out, err } = await runCommand(["crosscheck", faulty, "--out", json]);
    const { provenance, rows } = JSON.parse(readFileSync(json, "utf8"));
    expect(rows[0]).toMatchObject({ row: 2, line: 3, severity: "error" });
    expect(provenance.note).toContain("columns of findings, version 1; 4 rows checked");
    expect(out).toContain("findings in 4 rows");
    expect(err).toBe("");
    expect((await runCommand(["crosscheck", faulty, "--out", json, "--quiet"])).out).toBe("");
  });

  test.each([
    ["nothing grave", clean, "warning", 0],
    ["an error", faulty, "error", 1],
    ["a warning", faulty, "warning", 1],
  ])("--fail-on decides the exit code: %s", async (_, list, severity, expected) => {
    const { code, out, err } = await runCommand([
      "crosscheck",
      list,
      "--rules",
      "zero-uncertainty,kepler-third-law",
      "--fail-on",
      severity,
    ]);
    expect(code).toBe(expected);
    expect(out).toContain("row,name,rule");
    expect(err.includes(`--fail-on ${severity}`)).toBe(expected === 1);
  });

  test("--fail-on error does not fail on warnings", async () => {
    const args = ["crosscheck", faulty, "--rules", "zero-uncertainty", "--fail-on", "error"];
    expect((await runCommand(args)).code).toBe(0);
  });

  test("--rules and --ignore choose", async () => {
    const rules = async (...args: string[]) =>
      new Set(rowsOf((await runCommand(["crosscheck", faulty, ...args])).out).map(({ rule }) => rule));
    expect(await rules("--rules", "kepler-third-law,zero-uncertainty")).toEqual(
      new Set(["kepler-third-law", "zero-uncertainty"]),
    );
    expect(await rules("--ignore", "kepler-third-law")).not.toContain("kepler-third-law");
  });

  test("a name is verbatim in the table, and neither markup on the page nor a command to the terminal", async () => {
    const page = join(folder, "findings.html");
    const list = file(`odd\u001b[31m<b>.csv`, readFileSync(faulty, "utf8"));
    const { out, err } = await runCommand(["crosscheck", list, "--html", page]);
    expect(rowsOf(out).map(({ name }) => name)).toContain('=HYPERLINK("x") <img src=x onerror=alert(1)>\u001b[31m');
    expect(err).not.toContain("\u001b");
    const html = readFileSync(page, "utf8");
    for (const text of ["<img", "<b>", "\u001b"]) expect(html).not.toContain(text);
    expect(html).toContain("\\u003cimg src=x");
  });

  test("--choose looks at one publication a planet and says which", async () => {
    const list = `${header},reference\nA b,8,0.5,0.15,0.01,,,,Old 1999\nA b,8,0.5,0.14,0.01,,,,New 2020\n`;
    const { out } = await runCommand(["crosscheck", "-", "--choose", "newest"], { stdin: list });
    const found = rowsOf(out).filter(({ rule }) => rule === "denser-than-iron");
    expect(found.map(({ row, choice }) => [row, choice])).toEqual([["2", "newest of 2 (2020)"]]);
  });

  test("a cell that cannot be read is a finding", async () => {
    const { out } = await runCommand(["crosscheck", "-"], { stdin: `${header}\nA b,about 5,,1.2,0.1,,,\n` });
    expect(rowsOf(out)).toContainEqual(expect.objectContaining({ rule: "unreadable-cell", value: "about 5" }));
  });
});

describe("columns", () => {
  const unclear = "planet,M,R\nA b,5,1.6\n";

  test("that could mean two things stop the run with 2 and the options that settle it", async () => {
    const { code, out, err } = await runCommand(["crosscheck", "-"], { stdin: unclear });
    expect({ code, out }).toEqual({ code: 2, out: "" });
    expect(err).toContain("--column mass_earth=M");
    expect(err.match(/--column mass_earth=M/g)).toHaveLength(1);
  });

  test.each(["crosscheck", "classify"])("are settled by options and by a file beside the list: %s", async (command) => {
    const options = ["--column", "mass_earth=M", "--column", "radius_earth=R"];
    expect((await runCommand([command, "-", ...options], { stdin: unclear })).code).toBe(0);
    const list = file(`${command}.csv`, unclear);
    file(`${command}.csv.columns.json`, '{ "columns": { "mass_earth": "M", "radius_jupiter": "R" } }');
    const { code, err } = await runCommand([command, list]);
    expect(code).toBe(0);
    expect(err).toContain(`as ${list}.columns.json says`);
    file(`${command}.csv.columns.json`, '{ "colums": {} }');
    expect((await runCommand([command, list])).err).toContain('Did you mean "columns"?');
  });

  test.each(["crosscheck", "classify"])("are explained: %s", async (command) => {
    const { code, out, err } = await runCommand([command, faulty, "--explain-columns"]);
    expect(code).toBe(0);
    expect(err).toContain("is read as comma-separated");
    expect(rowsOf(out)[1]).toEqual({
      list: faulty,
      number: "2",
      column: "mass_earth",
      role: "value",
      meaning: "mass",
      unit: "earth",
      unit_source: "column name",
      perhaps: "",
      sample: "1",
    });
  });

  test("that are unclear are explained as such, and the exit code still is 2", async () => {
    const { code, out } = await runCommand(["crosscheck", "-", "--explain-columns"], { stdin: unclear });
    expect(code).toBe(2);
    expect(rowsOf(out).map(({ role }) => role)).toEqual(["text", "ambiguous", "ambiguous"]);
  });
});

describe("two lists", () => {
  const first = file("first.csv", `${header}\nInvented 1 b,1,0.05,1,0.02,,,\nInvented 2 b,5,0.3,1.6,0.02,,,\n`);
  const other = file(
    "other.csv",
    `${header},reference\ninvented-01 b,1.3,0.05,1,0.02,,,,x\nFar 7 c,5,0.3,2.4,0.02,,,,y\nFar 8 b,1,,1,,,,,z\n`,
  );
  const aliases = file("aliases.csv", "name,alias\nInvented 2 b,Far 7 c\n");

  test("are paired, compared and classified, one other list after another", async () => {
    const page = join(folder, "pairs.html");
    const args = ["crosscheck", first, other, clean, "--aliases", aliases, "--html", page];
    const { code, out, err } = await runCommand(args);
    expect(code).toBe(0);
    const line = out.split("\n").find((text) => !text.startsWith("# "));
    expect(line).toMatch(/^name,name_other,match,quantity,value,value_other,tension_sigma,verdict,verdict_other,/);
    const rows = rowsOf(out);
    const told = rows.map((row) => [row.list_other, row.name, row.name_other, row.match, row.quantity]);
    expect(told).toEqual([
      [other, "Invented 1 b", "invented-01 b", "name-ignoring-case", "mass_earth"],
      [other, "Invented 1 b", "invented-01 b", "name-ignoring-case", "radius_earth"],
      [other, "Invented 2 b", "Far 7 c", "alias", "mass_earth"],
      [other, "Invented 2 b", "Far 7 c", "alias", "radius_earth"],
      [other, "", "Far 8 b", "only-second", ""],
      [clean, "Invented 1 b", "Invented 1 b", "name", "mass_earth"],
      [clean, "Invented 1 b", "Invented 1 b", "name", "radius_earth"],
      [clean, "Invented 2 b", "", "only-first", ""],
    ]);
    // (1 − 1.3) / hypot(0.05, 0.05)
    expect(Number(rows[0].tension_sigma)).toBeCloseTo(-4.2426, 4);
    expect([rows[2].verdict, rows[2].verdict_other]).toEqual(["iron-silicate", "lighter-than-water"]);
    expect(err).toContain("2 pairs (1 by name-ignoring-case, 1 by alias), 0 ambiguous");
    expect(err).toContain("1 of 2 planets with a verdict in both lists change it");
    expect(readFileSync(page, "utf8")).toContain("lighter-than-water");
  });

  test("the choice among publications is shown on each row", async () => {
    const list = `${header},default_flag\nInvented 1 b,1,0.1,1,0.1,,,,0\nInvented 1 b,2,0.1,1,0.1,,,,1\n`;
    const choices = async (...args: string[]) =>
      rowsOf((await runCommand(["crosscheck", clean, "-", ...args], { stdin: list })).out).map((row) => [
        row.value_other,
        row.choice,
        row.choice_other,
      ]);
    expect((await choices())[0]).toEqual(["2.00000000000", "only publication", "preferred of 2"]);
    expect((await choices("--choose", "combine"))[0]).toEqual([
      "1.50000000000",
      "only publication",
      "combined from rows 1, 2",
    ]);
  });
});

test.each([
  ["a rule that is not there", ["crosscheck", faulty, "--rules", "kepler"], "There is no rule", 2],
  ["--fail-on with two lists", ["crosscheck", faulty, clean, "--fail-on", "error"], "for one list", 2],
  ["--aliases with one list", ["crosscheck", faulty, "--aliases", "a.csv"], "give another list", 2],
  ["standard input twice", ["crosscheck", "-", "-"], "only one list", 2],
  ["no list", ["crosscheck"], "missing required argument", 2],
  ["an unknown unit", ["crosscheck", faulty, "--unit", "star_mass=parsec"], "parsec", 2],
  ["writing over a list", ["crosscheck", faulty, clean, "--out", clean], "never overwritten", 1],
  ["aliases without columns", ["crosscheck", faulty, clean, "--aliases", clean], "Needed: name, alias", 1],
])("%s is refused", async (_, args, message, expected) => {
  const { code, out, err } = await runCommand(args);
  expect(err).toContain(message);
  expect({ code, out }).toEqual({ code: expected, out: "" });
});

test("an alias of two planets is refused", async () => {
  const aliases = file("two.csv", "name,alias\nA b,X\nB b,X\n");
  const { err } = await runCommand(["crosscheck", clean, faulty, "--aliases", aliases]);
  expect(err).toContain('"X" is given as an alias of "A b" and of "B b"');
});
