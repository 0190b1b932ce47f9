import { describe, expect, test } from "vitest";
import { descriptionText } from "../../src/cli/libraryText.ts";
import { densityAt, type Material, phaseAt } from "../../src/eos/material.ts";
import { meltingCurves } from "../../src/eos/melting/meltingCurves.ts";
import { meltingTemperature } from "../../src/eos/melting/meltingTemperature.ts";
import { checkLibrary } from "../../src/library/checkLibrary.ts";
import { describeComposition, describeMaterial } from "../../src/library/describe.ts";
import { loadLibrary } from "../../src/library/library.ts";
import type { LibraryFile } from "../../src/library/libraryFiles.ts";
import { sourcesOf } from "../../src/library/sources.ts";
import { GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import {
  bridgmanite,
  cold,
  compositionOf,
  hcpIron,
  liquidIron,
  mantleOf,
  materialOf,
  waterOf,
} from "../support/warmFiles.ts";
import { json } from "./files.ts";

const freezing = { curve: "iron-anzellini-2013" };
const mode = { kind: "adiabatic" } as const;

describe("a warm material file", () => {
  const { thermal } = bridgmanite;
  const withThermal = (keys: object): LibraryFile =>
    materialOf("m", { ...bridgmanite, thermal: { ...thermal, ...keys } });
  const withAlloy = (alloy: object): LibraryFile => materialOf("m", { ...hcpIron, alloy });
  const half = { ...bridgmanite, thermal: undefined };

  test.each<[string, LibraryFile, string, RegExp]>([
    [
      "without Debye temperature",
      withThermal({ debyeTemperatureK: undefined }),
      "phases[0].thermal.debyeTemperatureK",
      /missing; a number is needed/,
    ],
    [
      "with a reference of its own",
      withThermal({ reference: "isobar" }),
      "phases[0].thermal.reference",
      /"isobar" is not known\. Allowed: "isotherm", "isentrope"/,
    ],
    [
      "with an unknown Grüneisen law",
      withThermal({ gruneisen: { law: "powr" } }),
      "phases[0].thermal.gruneisen.law",
      /Did you mean "power"\?/,
    ],
    [
      "with a key of the other reference",
      withThermal({ heatCapacityJKgK: 640 }),
      "phases[0].thermal.heatCapacityJKgK",
      /unknown key/,
    ],
    [
      "with a negative reference temperature",
      withThermal({ temperatureK: -1 }),
      "phases[0].thermal.temperatureK",
      /a number above 0 is needed/,
    ],
    [
      "with a misspelt electronic term",
      materialOf("m", {
        ...hcpIron,
        thermal: { ...hcpIron.thermal, electronic: { coeficientJKgK2: 0.07, exponent: 1 } },
      }),
      "phases[0].thermal.electronic.coeficientJKgK2",
      /Did you mean "coefficientJKgK2"\?/,
    ],
    [
      "warm in some phases only",
      materialOf("m", { ...bridgmanite, untilGPa: 100 }, half),
      "phases[1]",
      /either every phase of a material has "thermal" or none/,
    ],
    [
      "with an alloy but cold",
      materialOf("m", { ...half, alloy: { nickel: 0.1 } }),
      "phases[0]",
      /need "thermal" beside them/,
    ],
    [
      "with a slope but no pressure",
      materialOf(
        "m",
        { ...liquidIron, untilFreezing: freezing, clapeyron: { atTemperatureK: 2000, slopeMPaPerK: 3 } },
        hcpIron,
      ),
      "phases[0]",
      /tilts the end given by "untilGPa"/,
    ],
    [
      "that ends warm phases by a crossing",
      materialOf("m", { ...bridgmanite, untilCrossing: true }, bridgmanite),
      "phases[0]",
      /cannot end by "untilCrossing"/,
    ],
    [
      "that freezes along a curve nobody published",
      materialOf("m", { ...liquidIron, untilFreezing: { curve: "iron" } }, hcpIron),
      "phases[0].untilFreezing.curve",
      /"iron-anzellini-2013"/,
    ],
    [
      "with less than no iron in the melt",
      materialOf("m", { ...liquidIron, untilFreezing: { ...freezing, ironMoleFraction: 0 } }, hcpIron),
      "phases[0].untilFreezing.ironMoleFraction",
      /a number above 0 is needed/,
    ],
    ["with a mantle of iron alone", mantleOf("m", 1, 1), "mantle.ironNumber", /a number below 1 is needed/],
    [
      "with a mantle without magnesium",
      mantleOf("m", 0, 0.1),
      "mantle.magnesiumToSilicon",
      /a number above 0 is needed/,
    ],
    [
      "that is two things",
      json("mine/materials/m.json", { material: "m", title: "t", water: true, phases: [bridgmanite] }),
      "",
      /exactly one of "phases", "mantle" and "water"/,
    ],
    [
      "that is nothing",
      json("mine/materials/m.json", { material: "m", title: "t" }),
      "",
      /exactly one of "phases", "mantle" and "water"/,
    ],
  ])("%s is refused", (_, file, column, says) => {
    const [problem] = checkLibrary([file]);
    expect(problem?.place.column).toBe(column);
    expect(problem?.message).toMatch(says);
  });

  test.each<[string, LibraryFile, string, RegExp]>([
    [
      "whose light elements need more iron than there is",
      withAlloy({ sulphur: 0.4 }),
      "core-alloy",
      /more iron than there is/,
    ],
    [
      "whose isentrope is of another form",
      materialOf("m", { ...liquidIron, eos: hcpIron.eos }),
      "thermal-isentrope",
      /a Birch–Murnaghan form of order 4/,
    ],
    [
      "of a bridge",
      materialOf(
        "m",
        { ...bridgmanite, untilGPa: 100 },
        { ...bridgmanite, eos: { form: "bridge" }, untilGPa: 200 },
        bridgmanite,
      ),
      "thermal-missing",
      /a bridge has no temperature/,
    ],
    [
      "of a table",
      materialOf("m", { ...bridgmanite, eos: { form: "table", file: "t.csv" } }),
      "thermal-table",
      /a table has no temperature/,
    ],
    ["of a formula that is none", withThermal({ formula: "Xx" }), "formula", /Xx/],
  ])("%s cannot be built", (_, file, code, says) => {
    const [problem] = checkLibrary([file]);
    expect(problem).toMatchObject({ code, place: { file: "mine/materials/m.json" } });
    expect(problem.message).toMatch(says);
  });
});

describe("a warm composition file", () => {
  const base = [
    materialOf("iron", hcpIron),
    materialOf("rock", bridgmanite),
    mantleOf("minerals", 1.2, 0.1),
    waterOf("sea"),
  ];
  const warm = { temperature: { mode: "adiabatic", potentialTemperatureK: 1600 } };
  const layer = (material: string, massFraction: number, heat: object = {}): object => ({
    material,
    massFraction,
    ...heat,
  });
  const problem = (layers: unknown, rest: object) => checkLibrary([...base, compositionOf("c", layers, rest)])[0];
  const two = (heat: object = {}): object[] => [layer("iron", 0.5, heat), layer("rock", 0.5)];

  test.each<[string, unknown, object, string, RegExp]>([
    [
      "an unknown mode",
      two(),
      { temperature: { mode: "warm" } },
      "temperature.mode",
      /"warm" is not known.*Allowed: "isothermal", "adiabatic", "table"/,
    ],
    [
      "no potential temperature",
      two(),
      { temperature: { mode: "adiabatic" } },
      "temperature.potentialTemperatureK",
      /missing/,
    ],
    [
      "a table that falls in pressure",
      two(),
      { temperature: { mode: "table", pressureGPa: [0, 5, 4], temperatureK: [1, 2, 3] } },
      "temperature",
      /pressures rising/,
    ],
    [
      "a table of unequal columns",
      two(),
      { temperature: { mode: "table", pressureGPa: [0, 5, 6], temperatureK: [1, 2] } },
      "temperature",
      /3 pressures and 2 temperatures/,
    ],
    ["a jump and a temperature", two({ temperatureJumpK: 10, topTemperatureK: 3000 }), warm, "layers[0]", /not both/],
    ["a cooling jump", two({ temperatureJumpK: -10 }), warm, "layers[0].temperatureJumpK", /above or equal to 0/],
    ["a jump in a cold planet", two({ temperatureJumpK: 10 }), {}, "layers", /the composition has no "temperature"/],
    [
      "a jump beside a table",
      two({ temperatureJumpK: 10 }),
      { temperature: { mode: "table", pressureGPa: [0, 5], temperatureK: [300, 400] } },
      "layers",
      /a table gives the temperature/,
    ],
    [
      "a jump at the surface",
      [layer("iron", 0.5), layer("rock", 0.5, { temperatureJumpK: 10 })],
      warm,
      "layers",
      /begins at the temperature of the surface/,
    ],
    [
      "warm materials in a mixture",
      [{ mixture: [layer("minerals", 0.5), layer("sea", 0.5)], massFraction: 1 }],
      warm,
      "layers[0].mixture",
      /"minerals" depends on temperature/,
    ],
  ])("with %s is refused", (_, layers, rest, column, says) => {
    const found = problem(layers, rest);
    expect(found?.place.column).toBe(column);
    expect(found?.message).toMatch(says);
    expect(found?.place.file).toBe("mine/c.json");
  });

  const library = loadLibrary([
    ...base,
    compositionOf("inner", two()),
    compositionOf("outer", [{ composition: "inner", massFraction: 0.8, temperatureJumpK: 50 }, layer("sea", 0.2)], {
      temperature: { mode: "adiabatic", potentialTemperatureK: 280 },
      surface: { pressurePa: 1e5, temperatureK: 280 },
    }),
    compositionOf("mine", [layer("minerals", 1)], { surface: { pressurePa: 1e5, temperatureK: 800 } }),
    compositionOf("plain", [layer("sea", 1)]),
  ]);

  test("keeps what it says of the layers of a nested composition, at that one's top", () => {
    expect(library.composition("outer").layers.map(({ heating }) => heating)).toEqual([
      undefined,
      { jump: 50 },
      undefined,
    ]);
  });

  test("without temperature is as warm as its surface where a material exists only with it", () => {
    expect(library.composition("mine").temperature).toEqual({ mode: { kind: "isothermal" }, top: 800 });
  });
});

describe("a mantle given by its atoms", () => {
  const library = loadLibrary([mantleOf("mantle", 1.25, 0.107), mantleOf("iron-free", 1, 0)]);

  test("is enstatite of known density where it is MgSiO3 alone", () => {
    // Stixrude & Lithgow-Bertelloni 2011: V0 of Mg2Si2O6 62.676 cm³/mol, molar mass 200.774 g/mol.
    expectClose(densityAt(library.material("iron-free"), 0), 200.774 / 62.676e-3, {
      rel: 1e-5,
      because: "atomic weights",
    });
  });

  test("follows the temperature it is given", () => {
    const { warmed } = library.material("mantle");
    const [hot, cool] = [2000, 1200].map((temperature) => warmed?.(mode, 0, temperature) ?? []);
    expect(hot[1].fromPressure).toBeGreaterThan(cool[1].fromPressure);
    // 3.25 MPa/K at the olivine boundary; the adiabats are 800 K apart at the top and more below.
    expect((hot[1].fromPressure - cool[1].fromPressure) / 3.25e6).toBeGreaterThan(800);
  });
});

describe("a core that freezes", () => {
  const core = (ironMoleFraction?: number): Material =>
    loadLibrary([
      materialOf("core", { ...liquidIron, untilFreezing: { ...freezing, ironMoleFraction } }, hcpIron),
    ]).material("core");
  const frozenFrom = (material: Material, temperature: number): number =>
    material.warmed?.({ kind: "isothermal" }, 50 * GPA, temperature).at(-1)?.fromPressure ?? Number.NaN;

  test("does so on the published curve", () => {
    const pressure = frozenFrom(core(), 5000);
    expectClose(meltingTemperature(meltingCurves.ironAnzellini, pressure), 5000, { rel: 1e-9, because: "a root" });
  });

  test("does so deeper the more is dissolved, by 1/(1 - ln x)", () => {
    const pressure = frozenFrom(core(0.9), 5000);
    const melting = meltingTemperature(meltingCurves.ironAnzellini, pressure);
    expectClose(melting / (1 - Math.log(0.9)), 5000, { rel: 1e-9, because: "Stixrude 2014, from memory" });
  });

  test("is solid throughout where it is cold", () => {
    expect(core().phases.map(({ name }) => name)).toEqual(["hcp"]);
  });
});

describe("a boundary with a Clapeyron slope", () => {
  const file = materialOf(
    "m",
    { ...bridgmanite, phase: "low", untilGPa: 50, clapeyron: { atTemperatureK: 2000, slopeMPaPerK: 5 } },
    bridgmanite,
  );
  const { warmed } = loadLibrary([file]).material("m");

  test.each([
    [1500, 47.5],
    [2000, 50],
    [3000, 55],
  ])("at %d K lies at %f GPa", (temperature, gpa) => {
    const [, second] = warmed?.({ kind: "isothermal" }, 0, temperature) ?? [];
    expectClose(second.fromPressure, gpa * GPA, { rel: 1e-12, because: "a straight line" });
  });
});

describe("water", () => {
  const sea = loadLibrary([waterOf("sea")]).material("sea");

  test("is ice in vacuum, and liquid over ice under a sea", () => {
    expect(sea.phases[0].name).toBe("ice-Ih");
    const names = sea.warmed?.(mode, 1e5, 280).map(({ name }) => name);
    expect(names?.slice(0, 2)).toEqual(["liquid", "ice-VI"]);
  });

  test("follows no table", () => {
    const table = { kind: "table", temperatureAt: () => 280, kinks: [] } as const;
    expect(() => sea.warmed?.(table, 1e5, 280)).toThrow(expect.objectContaining({ code: "temperature-table" }));
  });
});

describe("the sources of a warm planet", () => {
  const of = (...files: LibraryFile[]) => sourcesOf([loadLibrary(files).composition("m")]);

  test("name every mineral", () => {
    const notes = of(mantleOf("m", 1.25, 0.1)).map(({ note }) => note ?? "");
    expect(notes.some((note) => note.includes("Fe-wadsleyite (by analogy)"))).toBe(true);
  });

  test("name phases that are not stable at room temperature, and what the file as a whole rests on", () => {
    const core = materialOf("m", { ...liquidIron, untilFreezing: freezing }, hcpIron);
    expect(of(core).map(({ subject }) => subject)).toEqual(["m, liquid (birch-murnaghan)", "m, hcp (birch-murnaghan)"]);
    const mantle = {
      material: "m",
      title: "t",
      mantle: { magnesiumToSilicon: 1, ironNumber: 0 },
      source: { citation: "S" },
    };
    expect(of(json("mine/materials/m.json", mantle))[0]).toEqual({ subject: "m", citation: "S" });
  });

  test("name those of the compounds in an alloy", () => {
    const [source] = of(materialOf("m", { ...hcpIron, alloy: { silicon: 0.05 } }));
    expect(source.note).toBe(
      "silicon as FeSi: Fischer et al. 2014, J. Geophys. Res. Solid Earth 119, 2810 (B2), from memory, low confidence",
    );
  });
});

describe("the description of a warm material", () => {
  const library = loadLibrary([
    materialOf(
      "core",
      { ...liquidIron, alloy: { nickel: 0.05 }, untilFreezing: { ...freezing, ironMoleFraction: 0.9 } },
      hcpIron,
    ),
    materialOf(
      "rock",
      { ...bridgmanite, phase: "low", untilGPa: 50, clapeyron: { atTemperatureK: 2000, slopeMPaPerK: 5 } },
      bridgmanite,
    ),
    mantleOf("mantle", 1.25, 0.107),
    waterOf("sea"),
    materialOf("cold", cold(hcpIron)),
  ]);
  const shown = (name: string) => describeMaterial(library, name);

  test("lists every phase with what makes it warm, and ranges at room temperature", () => {
    const { temperatureK, phases } = shown("core");
    expect(temperatureK).toBe(300);
    expect(phases).toMatchObject([
      {
        name: "liquid",
        parameters: { densityZeroKgM3: 7019 },
        warmKeys: {
          thermal: { reference: "isentrope", gammaZero: 1.735 },
          alloy: { nickel: 0.05 },
          untilFreezing: { curve: "iron-anzellini-2013", ironMoleFraction: 0.9 },
        },
      },
      {
        name: "hcp",
        warmKeys: {
          thermal: { reference: "isotherm", formula: "Fe", debyeTemperatureK: 422 },
          gruneisen: { law: "power", q: 0.78 },
          electronic: { coefficientJKgK2: 0.07 },
        },
        fromGPa: 0,
      },
    ]);
    expect(phases[0]).not.toHaveProperty("fromGPa");
    expect(shown("rock").phases[0]).toMatchObject({ untilGPa: 41.5, warmKeys: { clapeyron: { slopeMPaPerK: 5 } } });
  });

  test("lists the minerals of a mantle, whose fractions sum to 1, with their sources", () => {
    const { parameters, phases } = shown("mantle");
    expect(parameters).toEqual({ magnesiumToSilicon: 1.25, ironNumber: 0.107 });
    expect(phases).toHaveLength(5);
    for (const { minerals = [] } of phases) {
      const sum = minerals.reduce((total, { massFraction }) => total + massFraction, 0);
      expectClose(sum, 1, { rel: 1e-14, because: "mass balance" });
      expect(minerals.every(({ source }) => source.citation.includes("2011"))).toBe(true);
    }
    // Olivine to wadsleyite, 13.9 GPa at 1775 K with 3.25 MPa/K, carried down to 300 K.
    expectClose(phases[0].untilGPa ?? 0, 13.9 - 3.25e-3 * 1475, { rel: 1e-9, because: "a straight line" });
  });

  test("is that of ice for water, and has no temperature for a cold material", () => {
    const { temperatureK, phases } = shown("sea");
    expectClose(temperatureK ?? 0, 250, { rel: 1e-9, because: "polynomials" });
    expect(phases[0]).toMatchObject({ name: "ice-Ih", fromGPa: 0 });
    expect(shown("cold")).not.toHaveProperty("temperatureK");
    expect(shown("cold").phases[0]).not.toHaveProperty("warmKeys");
  });

  test("of a composition holds its temperatures", () => {
    const layers = [
      { material: "core", massFraction: 0.3, topTemperatureK: 4500 },
      { material: "rock", massFraction: 0.3, temperatureJumpK: 200 },
      { material: "mantle", massFraction: 0.4 },
    ];
    const file = compositionOf("c", layers, { temperature: { mode: "adiabatic", potentialTemperatureK: 1600 } });
    const materials = [materialOf("core", hcpIron), materialOf("rock", bridgmanite), mantleOf("mantle", 1.25, 0.1)];
    const text = descriptionText(describeComposition(loadLibrary([...materials, file]), "c"));
    expect(text).toContain("  temperature: adiabatic, 1600 K at the surface\n");
    expect(text).toContain("core, mass fraction 0.3, 4500 K at its top\n");
    expect(text).toContain("rock, mass fraction 0.3, 200 K warmer than the layer above\n");
    expect(text).toContain("mantle, mass fraction 0.4\n");
  });

  test("reads well", () => {
    const text = descriptionText(shown("core"));
    expect(text).toContain("pressures and densities at 300 K; a planet has its own temperatures");
    expect(text).toContain(
      "    untilFreezing: curve iron-anzellini-2013, ironMoleFraction 0.9\n    not stable at this temperature\n",
    );
    expect(descriptionText(shown("mantle"))).toMatch(
      /phase bridgmanite: finite-strain-debye\n {4}74 % Mg-bridgmanite \(Stixrude/,
    );
  });
});

test("phases of a stack are found by pressure", () => {
  const { material } = loadLibrary([mantleOf("mantle", 1.25, 0.1)]).composition("mantle").layers[0];
  expect(phaseAt(material, 30 * GPA).name).toBe("bridgmanite");
});
