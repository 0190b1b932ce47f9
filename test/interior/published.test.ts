import { describe, expect, it } from "vitest";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { constants, EARTH_MASS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { planetOf } from "../support/referenceMaterials.ts";

/** Both papers use the mean radius of the Earth. */
const R_EARTH = constants.earthMeanRadius.value;
const radius = (layers: [string, number][], mass: number): number =>
  solvePlanet(planetOf(layers), mass * EARTH_MASS).radius / R_EARTH;

/**
 * Seager et al. 2007, ApJ 669, 1279, eq. 24 and table 4 (coefficients from memory, confirmed by integrating the same
 * polytropes independently): log10 R/r1 = k1 + (1/3) log10(M/m1) - k2 (M/m1)^k3.
 */
describe("the modified polytropes", () => {
  const relation = (mass: number, [m1, r1, k1, k2, k3]: number[]): number =>
    r1 * 10 ** (k1 + Math.log10(mass / m1) / 3 - k2 * (mass / m1) ** k3);
  const generic = [-0.20945, 0.0804, 0.394];
  const table4: Record<string, number[]> = {
    "fe-poly": [5.8, 2.52, -0.20949, 0.0804, 0.394],
    "sil-poly": [10.55, 3.9, -0.209594, 0.0799, 0.413],
    "h2o-poly": [5.52, 4.43, -0.209396, 0.0807, 0.375],
  };

  it.each(Object.entries(table4))("%s follow the published relation, 0.1 to 20 Earth masses", (material, own) => {
    for (const mass of [0.1, 0.3, 1, 3, 10, 20]) {
      const found = radius([[material, 1]], mass);
      expectClose(found, relation(mass, own), { rel: 5e-3, because: "the relation is a fit" });
      expectClose(found, relation(mass, [own[0], own[1], ...generic]), { rel: 1e-2, because: "one k for all" });
    }
  });
});

/** Zeng, Sasselov & Jacobsen 2016, ApJ 819, 127, abstract: R = (1.07 - 0.21 CMF) M^(1/3.7) for 1–8 Earth masses. */
describe("the Birch–Murnaghan fit to the Earth", () => {
  it.each([0, 0.1, 0.26, 0.325, 0.4])("follows the published relation at core mass fraction %d", (core) => {
    for (const mass of [1, 2, 4, 8]) {
      const layers: [string, number][] = core > 0 ? [["fe-bm3", core]] : [];
      const found = radius([...layers, ["mantle-bm3", 1 - core]], mass);
      const fit = (1.07 - 0.21 * core) * mass ** (1 / 3.7);
      expectClose(found, fit, { rel: 2e-2, because: "a fit; the paper keeps a lighter upper mantle" });
    }
  });
});

/** Radii of cold single-layer planets [6371 km] by an independent integration (SciPy), five significant digits. */
describe("single layers of published equations of state", () => {
  it.each([
    ["fe-vinet", [0.3887, 0.7718, 1.187, 1.4046]],
    ["pv-bm4", [0.5057, 1.0466, 1.6612, 1.9879]],
    ["ice-bm3", [0.7002, 1.3901, 2.1074, 2.4745]],
  ])("%s", (material, expected) => {
    [0.1, 1, 5, 10].forEach((mass, i) => {
      expect(radius([[material, 1]], mass)).toBeCloseTo(expected[i], 3);
    });
  });
});
