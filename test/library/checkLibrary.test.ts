import { describe, expect, test } from "vitest";
import { checkLibrary } from "../../src/library/checkLibrary.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { composition, constantPhase, layer, material, withEos } from "./files.ts";

describe("checking a library", () => {
  test("finds nothing wrong with the shipped one", () => {
    expect(checkLibrary(shippedFiles)).toEqual([]);
  });

  test("lists every problem of every file at once", () => {
    const problems = checkLibrary([
      { path: "mine/broken.json", text: "{" },
      composition("a", [layer("m", 2)], { colour: "red" }),
      withEos({ form: "constant", densityKgM3: 0 }),
    ]);
    expect(problems.map(({ code, place }) => [code, place.file])).toEqual([
      ["json-syntax", "mine/broken.json"],
      ["unknown-key", "mine/a.json"],
      ["wrong-value", "mine/a.json"],
      ["mass-fraction-sum", "mine/a.json"],
      ["wrong-value", "mine/materials/m.json"],
    ]);
  });

  test("then builds what is well formed, and reports a broken material once", () => {
    const falling = material("m", [constantPhase("a", 2000, { untilGPa: 1 }), constantPhase("b", 1000)]);
    const problems = checkLibrary([falling, composition("a", [layer("m", 1)]), composition("b", [layer("n", 1)])]);
    expect(problems.map(({ code }) => code)).toEqual(["density-falls", "unknown-material"]);
  });

  test("knows what the library beside it defines", () => {
    const files = [composition("a", [layer("iron-birch-2025", 1)])];
    expect(checkLibrary(files, shippedFiles)).toEqual([]);
    expect(checkLibrary(files)).toHaveLength(1);
  });

  test("leaves other files alone", () => {
    expect(checkLibrary([{ path: "mine/README.md", text: "{" }])).toEqual([]);
  });
});
