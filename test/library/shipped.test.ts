import { describe, expect, test } from "vitest";
import { densityAt, type Material } from "../../src/eos/material.ts";
import { describeMaterial } from "../../src/library/describe.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { sourcesOf } from "../../src/library/sources.ts";
import { expectClose } from "../support/expectClose.ts";

const library = loadLibrary(shippedFiles);
const names = library.materials.map(({ name }) => name);
const compositions = library.compositions.map(({ name }) => name);
const GPA = 1e9;

const alternatives = ["magnesium-silicate-2016", "water-ice-vii-2004"];
const defaults = ["iron-birch-2025", "magnesium-silicate", "water-ice-vii"];
const polytropes = names.filter((name) => name.endsWith("-polytrope"));

test("all promised materials and compositions are there", () => {
  const others = ["iron-vinet-2007", "iron-vinet-2018", "iron-birch-2016", "earth-mantle-birch", "earth-core-birch"];
  const warm = [
    ...["core-earth", "core-earth-cosmochemical", "core-mars", "core-mercury", "core-moon", "core-chondritic"],
    ...["mantle-pyrolite", "mantle-mars", "mantle-mercury", "mantle-moon", "silicate-chondritic", "water-phases"],
  ];
  const cold = ["crust-mars", "crust-moon", "serpentine-chondritic", "troilite"];
  expect([...names].sort()).toEqual([...defaults, ...alternatives, ...others, ...polytropes, ...warm, ...cold].sort());
  expect(polytropes).toHaveLength(6);
  expect([...compositions].sort()).toEqual(
    [
      "iron",
      "silicate",
      "water",
      "earth-like",
      "iron-rich",
      "coreless",
      "earth-like-gas-2",
      "earth-like-water-10",
      "earth-like-water-30",
      "earth-like-water-50",
      "earth-like-iron-vinet-2007",
      "earth-like-iron-vinet-2018",
      "earth-like-iron-birch-2016",
      ...["earth", "earth-cosmochemical-core", "venus", "mars", "mercury", "moon", "io", "europa", "ganymede"],
      ...["callisto", "callisto-hydrated", "titan", "titan-hydrated"],
    ].sort(),
  );
});

describe.each(names)("%s", (name) => {
  const material = library.material(name);

  test("never falls in density up to 1e16 Pa", () => {
    let before = densityAt(material, 0);
    for (const pressure of ladder(material)) {
      const density = densityAt(material, pressure);
      expect(density).toBeGreaterThanOrEqual(before * (1 - 4e-15));
      before = density;
    }
  });

  test("says where its numbers come from", () => {
    for (const { source } of material.phases) expect(source.citation).toMatch(/[12]\d{3}|Bulkwright/);
  });

  test("is marked as extrapolated somewhere, unless it is a fit to a theory all the way up", () => {
    expect(material.phases[0].calibratedTo).toBeLessThanOrEqual(1e16);
  });
});

/** Pressures from 1e5 to 1e16 Pa, or to where the last form ends, with both sides of every phase boundary. */
function ladder({ phases }: Material): number[] {
  const end = phases[phases.length - 1].curve.maxPressure;
  const steps = Array.from({ length: 2201 }, (_, i) => 10 ** (5 + i / 200)).filter((pressure) => pressure <= end);
  const boundaries = phases.slice(1).flatMap(({ fromPressure: p }) => [p * (1 - 1e-12), p, p * (1 + 1e-12)]);
  return [...steps, ...boundaries].sort((a, b) => a - b);
}

describe.each(compositions)("%s", (name) => {
  const composition = library.composition(name);

  test("sums to the whole planet", () => {
    const sum = composition.layers.reduce((total, { massFraction }) => total + massFraction, 0);
    expectClose(sum, 1, { rel: 1e-15, because: "rounding of a few additions" });
  });

  test("never falls in density with pressure, mixtures included", () => {
    for (const { material } of composition.layers) {
      const densities = ladder(material).map((pressure) => densityAt(material, pressure));
      const falls = densities.filter((density, i) => i > 0 && density < densities[i - 1] * (1 - 4e-15));
      expect(falls).toEqual([]);
    }
  });
});

describe("continuation by Thomas–Fermi–Dirac", () => {
  test.each(defaults)("%s ends in it", (name) => {
    expect(library.material(name).phases.at(-1)?.form).toBe("thomas-fermi-dirac");
  });

  // Computed for this project by an independent program from the same parameters.
  test.each([
    ["iron-birch-2025", 8151],
    ["iron-birch-2016", 8516],
    ["magnesium-silicate", 4757],
    ["water-ice-vii", 10610],
  ])("%s crosses over at %f GPa", (name, gpa) => {
    const from = library.material(name).phases.at(-1)?.fromPressure ?? 0;
    expectClose(from / GPA, gpa, { rel: 6e-4, because: "four digits, and curves that meet at a small angle" });
  });

  test.each(["iron-vinet-2007", "iron-vinet-2018"])("%s states the ends and the gap of its bridge", (name) => {
    const { joins, phases } = describeMaterial(library, name);
    expect(joins).toHaveLength(1);
    const [join] = joins;
    if (join.kind !== "bridge") throw new Error(`${name} has no bridge`);
    const stated = [...(phases[1].source.note ?? "").matchAll(/([\d.]+) (GPa|%)/g)].map(([, value]) => Number(value));
    const percent = (step: number | undefined): number => -100 * (step ?? 0);
    expect(stated[0]).toBe(join.fromGPa);
    expectClose(stated[1], percent(join.stepAtFrom), { rel: 5e-3, because: "stated to three digits" });
    expect(stated[2]).toBe(join.untilGPa);
    expectClose(stated[3], percent(join.stepAtUntil), { rel: 1e-2, because: "stated to two digits" });
  });
});

test("the Earth-like composition tells what a pure iron core does to the radius", () => {
  expect(library.composition("earth-like").title).toContain("0.985 to 0.99 Earth radii at one Earth mass");
});

test("nothing but the alternative iron differs between the Earth-like recipes", () => {
  for (const iron of ["iron-vinet-2007", "iron-vinet-2018", "iron-birch-2016"]) {
    const layers = library.composition(`earth-like-${iron}`).layers.map((layer) => [layer.name, layer.massFraction]);
    expect(layers).toEqual([
      [iron, 0.325],
      ["magnesium-silicate", 0.675],
    ]);
  }
});

test("sources of a mixture are those of its parts, each once", () => {
  const subjects = sourcesOf([library.composition("coreless"), library.composition("iron")]).map(
    ({ subject }) => subject,
  );
  expect(subjects).toEqual([
    "coreless",
    "iron-birch-2025, hcp (birch-murnaghan)",
    "magnesium-silicate, enstatite (birch-murnaghan)",
    "magnesium-silicate, bridgmanite (birch-murnaghan)",
    "magnesium-silicate, post-perovskite (birch-murnaghan)",
    "magnesium-silicate, degenerate (thomas-fermi-dirac)",
    "iron-birch-2025, degenerate (thomas-fermi-dirac)",
  ]);
});
