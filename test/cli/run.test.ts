import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { commands } from "../../src/cli/commands.ts";
import { runCommand } from "./runCommand.ts";

describe("help and version", () => {
  test("the version is the package's", async () => {
    const { version } = JSON.parse(readFileSync("package.json", "utf8"));
    expect(await runCommand(["--version"])).toEqual({ code: 0, out: `${version}\n`, err: "" });
  });

  test("help lists every command", async () => {
    const { code, out, err } = await runCommand(["--help"]);
    expect({ code, err }).toEqual({ code: 0, err: "" });
    for (const { name } of commands) expect(out).toContain(`  ${name} `);
  });

  test.each([...commands.map(({ name }) => [name]), ["library", "list"], ["library", "show"], ["library", "check"]])(
    "%s %s has help with an example",
    async (...words) => {
      const path = words.filter((word) => word !== undefined);
      const { code, out } = await runCommand([...path, "--help"]);
      expect(code).toBe(0);
      expect(out).toMatch(new RegExp(`Examples?:\n  bulkwright ${path.join(" ")}`));
      expect(out).toContain("--earth-radius-km");
    },
  );
});

describe("wrong usage ends with 2 and a message, and prints no result", () => {
  test.each([
    ["no command", [], "Usage:"],
    ["an unknown command", ["curves"], "Did you mean curve?"],
    ["an unknown option", ["curve", "earth-like", "--mases", "1"], "Did you mean --masses?"],
    ["a missing name", ["curve"], "missing required argument 'name'"],
    ["text for a number", ["curve", "earth-like", "--masses", "nope"], "masses above 0"],
    ["a negative pressure", ["curve", "earth-like", "--surface-pressure-pa", "-1"], "0 or more"],
    ["an unknown format", ["curve", "earth-like", "--format", "xml"], "csv, json"],
    ["an Earth radius in metres", ["--earth-radius-km", "6378100", "library", "list"], "6300 to 6400"],
    ["profile without name and table", ["profile"], "--density-table"],
    ["profile with name and no mass", ["profile", "earth-like"], "--mass"],
    ["classify without anything", ["classify"], "--mass-earth"],
    ["precision without a pair", ["precision", "a.csv"], "--between"],
    ["precision between one composition", ["precision", "a.csv", "--between", "iron,iron"], "two different"],
    ["precision without anything", ["precision", "--between", "a,b"], "--mass-earth"],
    ["a map of a list", ["precision", "a.csv", "--between", "a,b", "--html", "x.html"], "for one planet"],
    [
      "a ranking of one planet",
      ["precision", "--mass-earth", "1,0.1", "--between", "a,b", "--halve", "mass"],
      "a list",
    ],
    ["a percentage below 0", ["precision", "--mass-errors-percent", "-1"], "percentages above 0"],
    ["classify with a list and a planet", ["classify", "a.csv", "--mass-earth", "1,0.1"], "--mass-earth"],
  ])("%s", async (_, args, message) => {
    const { code, out, err } = await runCommand(args);
    expect({ code, out }).toEqual({ code: 2, out: "" });
    expect(err).toContain(message);
  });
});

test("control characters of the command line are not passed to the terminal", async () => {
  const { err } = await runCommand(["\u001b[2Jcurve"]);
  expect(err).toContain("\\u001b[2Jcurve");
  expect(err).not.toContain("\u001b");
});

test("errors are coloured only where asked", async () => {
  expect((await runCommand(["nope"], { useColor: true })).err).toContain("\u001b[31merror:\u001b[39m unknown command");
  expect((await runCommand(["nope"])).err).toContain("error: unknown command");
});
