import { describe, expect, test } from "vitest";
import { densityAt } from "../../src/eos/material.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { expectClose } from "../support/expectClose.ts";
import { composition, constantPhase, layer, material, withEos } from "./files.ts";

const heavy = material("heavy", [constantPhase("solid", 8000)]);
const light = material("light", [constantPhase("solid", 2000)]);
const rounding = { rel: 1e-14, because: "rounding" };

const layersOf = (library: ReturnType<typeof loadLibrary>, name: string): [string, number][] =>
  library.composition(name).layers.map((each) => [each.name, each.massFraction]);

describe("a library", () => {
  test("lists what its files define, with titles and paths", () => {
    const library = loadLibrary([heavy, composition("a", [layer("heavy", 1)])]);
    expect(library.materials).toMatchObject([
      { kind: "material", name: "heavy", title: "Title of heavy", path: "mine/materials/heavy.json" },
    ]);
    expect(library.compositions).toMatchObject([{ kind: "composition", name: "a", path: "mine/a.json" }]);
    expect(library.notes).toEqual([]);
  });

  test("builds each thing once", () => {
    const library = loadLibrary([heavy, composition("a", [layer("heavy", 1)])]);
    expect(library.material("heavy")).toBe(library.material("heavy"));
    expect(library.composition("a")).toBe(library.composition("a"));
    expect(library.composition("a").layers[0].material).toBe(library.material("heavy"));
  });

  test("looks at a file no further than its name until it is asked for", () => {
    const library = loadLibrary([heavy, material("broken", "no phases at all")]);
    expect(densityAt(library.material("heavy"), 1e9)).toBe(8000);
    expect(() => library.material("broken")).toThrowError(/phases/);
  });

  test("lets a later file take the place of an earlier one, and says so", () => {
    const mine = { ...material("heavy", [constantPhase("solid", 9000)]), path: "own/materials/h.json" };
    const library = loadLibrary([heavy, mine]);
    expect(densityAt(library.material("heavy"), 0)).toBe(9000);
    expect(library.materials).toHaveLength(1);
    expect(library.notes).toEqual([
      'material "heavy": own/materials/h.json takes the place of mine/materials/heavy.json',
    ]);
  });

  test("takes the name of a material for a planet of that material alone", () => {
    const library = loadLibrary([heavy]);
    expect(library.composition("heavy")).toMatchObject({
      name: "heavy",
      title: "Title of heavy",
      surface: { pressurePa: 0, temperatureK: 300 },
      layers: [{ name: "heavy", massFraction: 1 }],
    });
  });

  test("tells files of materials by their folder, also with Windows separators", () => {
    const windows = { ...heavy, path: "C:\\mine\\materials\\heavy.json" };
    expect(loadLibrary([windows]).materials).toHaveLength(1);
  });
});

describe("a composition", () => {
  test("has its own surface and source where it gives them", () => {
    const surface = { pressurePa: 1e5, temperatureK: 280 };
    const source = { citation: "somebody" };
    const library = loadLibrary([heavy, composition("a", [layer("heavy", 1)], { surface, source })]);
    expect(library.composition("a")).toMatchObject({ surface, source });
  });

  test("expands and scales nested compositions", () => {
    const library = loadLibrary([
      heavy,
      light,
      composition("inner", [layer("heavy", 0.25), layer("light", 0.75)]),
      composition("middle", [{ composition: "inner", massFraction: 0.5 }, layer("light", 0.5)]),
      composition("outer", [{ composition: "middle", massFraction: 0.8 }, layer("heavy", 0.2)]),
    ]);
    const layers = layersOf(library, "outer");
    expect(layers.map(([name]) => name)).toEqual(["heavy", "light", "light", "heavy"]);
    layers.forEach(([, fraction], i) => {
      expectClose(fraction, [0.1, 0.3, 0.4, 0.2][i], rounding);
    });
  });

  test("mixes materials in a layer", () => {
    const mixture = { mixture: [layer("heavy", 0.5), layer("light", 0.5)], massFraction: 1 };
    const library = loadLibrary([heavy, light, composition("a", [mixture])]);
    const [only] = library.composition("a").layers;
    expect(only.name).toBe("heavy+light");
    expectClose(densityAt(only.material, 1e9), 1 / (0.5 / 8000 + 0.5 / 2000), rounding);
  });

  test("drops what has no mass", () => {
    const library = loadLibrary([
      heavy,
      light,
      composition("a", [layer("light", 0), layer("heavy", 1)]),
      composition("b", [{ mixture: [layer("heavy", 1), layer("light", 0)], massFraction: 1 }]),
      composition("c", [{ composition: "a", massFraction: 0 }, layer("light", 1)]),
    ]);
    expect(layersOf(library, "a")).toEqual([["heavy", 1]]);
    expect(layersOf(library, "b")).toEqual([["heavy", 1]]);
    expect(layersOf(library, "c")).toEqual([["light", 1]]);
  });

  test("may miss a sum of 1 by 1e-9, which is taken out; not by more", () => {
    const thirds = composition("thirds", [layer("heavy", 0.3333333333), layer("light", 0.6666666666)]);
    const layers = layersOf(loadLibrary([heavy, light, thirds]), "thirds");
    expectClose(layers[0][1] + layers[1][1], 1, rounding);
    const short = composition("short", [layer("heavy", 0.33333333), layer("light", 0.66666666)]);
    expect(() => loadLibrary([heavy, light, short]).composition("short")).toThrowError(
      expect.objectContaining({ code: "mass-fraction-sum", message: expect.stringContaining("sum to 0.99999999;") }),
    );
  });

  test("of a mixture, too, the sum is checked", () => {
    const mixture = { mixture: [layer("heavy", 0.5), layer("light", 0.4)], massFraction: 1 };
    expect(() => loadLibrary([heavy, light, composition("a", [mixture])]).composition("a")).toThrowError(
      expect.objectContaining({
        code: "mass-fraction-sum",
        place: { file: "mine/a.json", column: "layers[0].mixture" },
      }),
    );
  });

  test("that comes back to itself is an error that shows the way", () => {
    const library = loadLibrary([
      composition("a", [{ composition: "b", massFraction: 1 }]),
      composition("b", [{ composition: "c", massFraction: 1 }]),
      composition("c", [{ composition: "b", massFraction: 1 }]),
    ]);
    expect(() => library.composition("a")).toThrowError(
      expect.objectContaining({ code: "composition-cycle", message: expect.stringContaining("a → b → c → b") }),
    );
    expect(() => library.composition("c")).toThrowError(/c → b → c/);
  });
});

describe("names nobody knows", () => {
  const library = loadLibrary([heavy, light, composition("a", [layer("heavi", 1)])]);

  test("of a composition, with the nearest of compositions and materials", () => {
    expect(() => library.composition("hevy")).toThrowError(
      expect.objectContaining({ code: "unknown-composition", found: "hevy" }),
    );
    expect(() => library.composition("hevy")).toThrowError('Did you mean "heavy"? Known: a, heavy, light.');
    expect(() => library.composition("quite-other")).toThrowError('named "quite-other". Known:');
  });

  test("of a material", () => {
    expect(() => library.material("ligth")).toThrowError(/no material is named "ligth"\. Did you mean "light"\?/);
  });

  test("inside a file, with the file and the key", () => {
    expect(() => library.composition("a")).toThrowError(
      expect.objectContaining({
        code: "unknown-material",
        place: { file: "mine/a.json", column: "layers[0].material" },
        message: expect.stringMatching(/^mine\/a\.json: layers\[0\]\.material: no material is named "heavi"/),
      }),
    );
  });
});

describe("a table", () => {
  const csv = "# measured\r\npressure_gpa,density_kg_m3\r\n0,1000\r\n10,1500\r\n";

  test("is found beside the material file that names it, and ends the data", () => {
    const library = loadLibrary([
      withEos({ form: "table", file: "./t.csv" }, {}),
      { path: "mine/materials/t.csv", text: csv },
    ]);
    const found = library.material("m");
    expect(densityAt(found, 0)).toBeCloseTo(1000, 9);
    expect(found.phases[0].calibratedTo).toBe(10e9);
    expect(() => densityAt(found, 11e9)).toThrowError(/outside/);
  });

  test("may stand in another folder", () => {
    const files = [withEos({ form: "table", file: "../tables/t.csv" }, {}), { path: "mine/tables/t.csv", text: csv }];
    expect(loadLibrary(files).material("m").phases).toHaveLength(1);
  });

  test("that is not there is an error that says where it was looked for", () => {
    expect(() => loadLibrary([withEos({ form: "table", file: "t.csv" }, {})]).material("m")).toThrowError(
      /mine\/materials\/m\.json: .*looked for as mine\/materials\/t\.csv/,
    );
  });
});
