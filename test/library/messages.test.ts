import { describe, expect, test } from "vitest";
import { checkLibrary } from "../../src/library/checkLibrary.ts";
import type { LibraryFile } from "../../src/library/libraryFiles.ts";
import { composition, constantPhase, json, layer, material, withEos } from "./files.ts";

const vinet = { form: "vinet", densityZeroKgM3: 8300, bulkModulusGPa: 156.2, bulkModulusPrime: 6.08 };
const source = { citation: "invented" };
const { bulkModulusGPa: _, ...vinetWithoutModulus } = vinet;

/** The first problem of a file: its code, its place, and what its message must say. */
const cases: [string, LibraryFile, { code: string; column: string; says: RegExp }][] = [
  [
    "a misspelt key",
    withEos({ ...vinetWithoutModulus, bulkModulsGPa: 156.2 }),
    {
      code: "unknown-key",
      column: "phases[0].eos.bulkModulsGPa",
      says: /^mine\/materials\/m\.json: phases\[0\]\.eos\.bulkModulsGPa: unknown key, with the value 156\.2\. Did you mean "bulkModulusGPa"\? Known keys here: form, densityZeroKgM3, bulkModulusGPa, bulkModulusPrime\.$/,
    },
  ],
  [
    "a key of another form",
    withEos({ form: "constant", densityKgM3: 3000, bulkModulusPrime: 4 }),
    { code: "unknown-key", column: "phases[0].eos.bulkModulusPrime", says: /Known keys here: form, densityKgM3\./ },
  ],
  [
    "a missing key",
    withEos(vinetWithoutModulus),
    { code: "wrong-value", column: "phases[0].eos.bulkModulusGPa", says: /missing; a number is needed/ },
  ],
  [
    "text for a number",
    withEos({ ...vinet, densityZeroKgM3: "8300" }),
    { code: "wrong-value", column: "phases[0].eos.densityZeroKgM3", says: /"8300" is not allowed; a number is needed/ },
  ],
  [
    "a negative density",
    withEos({ form: "constant", densityKgM3: -5 }),
    { code: "wrong-value", column: "phases[0].eos.densityKgM3", says: /-5 is not allowed; a number above 0 is needed/ },
  ],
  [
    "an unknown form",
    withEos({ ...vinet, form: "vinett" }),
    { code: "wrong-value", column: "phases[0].eos.form", says: /Did you mean "vinet"\? Allowed: "vinet", "birch-murn/ },
  ],
  ["no form", withEos({}), { code: "wrong-value", column: "phases[0].eos.form", says: /missing; allowed: "vinet", / }],
  [
    "an unknown order",
    withEos({ ...vinet, form: "birch-murnaghan", order: 5 }),
    { code: "wrong-value", column: "phases[0].eos.order", says: /5 is not known\. .*Allowed: 2, 3, 4\./ },
  ],
  [
    "an exponent of 1",
    withEos({ form: "modified-polytrope", densityZeroKgM3: 0, coefficientSI: 1, exponent: 1 }),
    { code: "wrong-value", column: "phases[0].eos.exponent", says: /1 is not allowed; a number below 1 is needed/ },
  ],
  [
    "no end of the data",
    withEos(vinet, {}),
    { code: "wrong-value", column: "phases[0]", says: /missing "calibratedToGPa"/ },
  ],
  [
    "no source",
    material("m", [{ phase: "solid", eos: vinet, calibratedToGPa: 330 }]),
    { code: "wrong-value", column: "phases[0].source", says: /missing; an object \{ … \} is needed/ },
  ],
  ["no phases", material("m", []), { code: "wrong-value", column: "phases", says: /must not be empty/ }],
  ["phases that are no list", material("m", {}), { code: "wrong-value", column: "phases", says: /a list \[ … \] is/ }],
  [
    "a phase without an end before another",
    material("m", [constantPhase("a", 1000), constantPhase("b", 2000)]),
    { code: "wrong-value", column: "phases[0]", says: /give this phase one end/ },
  ],
  [
    "two ends",
    material("m", [constantPhase("a", 1000, { untilGPa: 1, untilCrossing: true }), constantPhase("b", 2000)]),
    { code: "wrong-value", column: "phases[0]", says: /give this phase one end/ },
  ],
  [
    "an end of the last phase",
    material("m", [constantPhase("a", 1000, { untilGPa: 1 })]),
    { code: "wrong-value", column: "phases[0]", says: /the last phase has no end/ },
  ],
  [
    "untilCrossing: false",
    material("m", [constantPhase("a", 1000, { untilCrossing: false })]),
    { code: "wrong-value", column: "phases[0].untilCrossing", says: /false is not allowed; allowed: true/ },
  ],
  [
    "a name with a blank",
    json("mine/a.json", { composition: "a b", title: "t", layers: [layer("m", 1)] }),
    { code: "wrong-value", column: "composition", says: /letters, digits, dots, hyphens and underscores/ },
  ],
  [
    "a layer of two kinds",
    composition("a", [{ material: "m", composition: "b", massFraction: 1 }]),
    { code: "wrong-value", column: "layers[0]", says: /exactly one of "material", "mixture" and "composition"/ },
  ],
  [
    "a layer of no kind",
    composition("a", [{ massFraction: 1 }]),
    { code: "wrong-value", column: "layers[0]", says: /exactly one of/ },
  ],
  [
    "a mass fraction above 1",
    composition("a", [layer("m", 1.5)]),
    {
      code: "wrong-value",
      column: "layers[0].massFraction",
      says: /1\.5 is not allowed; a number below or equal to 1/,
    },
  ],
  [
    "mass fractions that miss 1",
    composition("a", [layer("m", 0.3), layer("m", 0.5)]),
    { code: "mass-fraction-sum", column: "layers", says: /sum to 0\.8; they must sum to 1 within 1e-9/ },
  ],
  [
    "a negative surface pressure",
    composition("a", [layer("m", 1)], { surface: { pressurePa: -1, temperatureK: 300 } }),
    { code: "wrong-value", column: "surface.pressurePa", says: /-1 is not allowed; a number above or equal to 0/ },
  ],
  [
    "a material without its name",
    json("mine/materials/m.json", { materiel: "m", title: "t" }),
    {
      code: "library-name",
      column: "material",
      says: /"material" is missing or not text.*Is "materiel" meant for it\?/,
    },
  ],
  [
    "a composition without a title",
    json("mine/a.json", { composition: "a", layers: [] }),
    { code: "library-name", column: "title", says: /"title" is missing or not text/ },
  ],
  [
    "a formula that is none",
    withEos({ form: "thomas-fermi-dirac", formula: "Mg(OH)2" }, {}),
    { code: "formula", column: "formula", says: /^mine\/materials\/m\.json: formula "Mg\(OH\)2": "\(OH\)2" is not an/ },
  ],
  [
    "a density that falls",
    material("m", [constantPhase("a", 2000, { untilGPa: 1 }), constantPhase("b", 1000)]),
    {
      code: "density-falls",
      column: "untilGPa",
      says: /phase "b": at 1 GPa.*1000\.00 kg\/m3.*below that of "a" \(2000\.00/,
    },
  ],
  [
    "a form that has turned over before its phase ends",
    material("m", [
      {
        phase: "a",
        eos: { ...vinet, form: "birch-murnaghan", order: 4, bulkModulusSecondPerGPa: -0.2 },
        untilGPa: 1e6,
        calibratedToGPa: 1,
        source,
      },
      constantPhase("b", 1e6),
    ]),
    { code: "phase-beyond-form", column: "untilGPa", says: /phase "a": it is to hold from 0 to 1000000 GPa.*defined/ },
  ],
  [
    "phases that never meet",
    material("m", [
      { phase: "a", eos: vinet, untilCrossing: true, calibratedToGPa: 330, source },
      { phase: "b", eos: { form: "thomas-fermi-dirac", formula: "Fe" }, source },
    ]),
    {
      code: "phases-never-cross",
      column: "untilCrossing",
      says: /phase "a": beyond 330 GPa.*closest: 0\.24\d %.*bridge/,
    },
  ],
];

describe("the message for", () => {
  test.each(cases)("%s", (_, file, { code, column, says }) => {
    const [first] = checkLibrary([material("other"), file]);
    expect(first).toMatchObject({ code, place: { file: file.path, column } });
    expect(first.message).toMatch(says);
  });

  test("a long value cuts it short", () => {
    const [first] = checkLibrary([withEos({ ...vinet, densityZeroKgM3: "8300 ".repeat(1000) })]);
    expect(first.message.length).toBeLessThan(200);
  });
});
