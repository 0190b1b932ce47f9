import { describe, expect, it } from "vitest";
import { parseAbundances, solarAbundances } from "../../src/mineralogy/abundances.ts";
import { planetFromStar } from "../../src/mineralogy/planetFromStar.ts";
import { expectClose } from "../support/expectClose.ts";

const only = (elements: string[]) =>
  Object.fromEntries(Object.entries(solarAbundances("asplund2021")).filter(([element]) => elements.includes(element)));

describe("planetFromStar", () => {
  it("gives the Sun a planet of 32 % iron", () => {
    // Asplund et al. 2021 ratios, Mg, Si, Fe and O alone: 0.3226; with Al and Ca counted 0.307.
    const sun = planetFromStar(parseAbundances("Fe/Mg=0.81,Si/Mg=0.91"));
    expectClose(sun.coreMassFraction.mean, 0.3226, { rel: 3e-4, because: "four digits" });
    expectClose(planetFromStar(only(["Fe", "Mg", "Si"])).coreMassFraction.mean, 0.3226, {
      rel: 0.005 / 0.3226,
      because: "ratios rounded to two digits there",
    });
    expectClose(planetFromStar(only(["Fe", "Mg", "Si", "Al", "Ca"])).coreMassFraction.mean, 0.307, {
      rel: 5e-3,
      because: "three digits",
    });
  });

  it("propagates errors as brute force on a grid of 241³ points does", () => {
    const { mean, low, high } = planetFromStar(only(["Fe", "Mg", "Si"])).coreMassFraction;
    expectClose(mean, 0.32326165971495524, { rel: 1e-9, because: "five-point quadrature of a smooth function" });
    expectClose(low, 0.30042273, { rel: 1e-4, because: "ln(core/mantle) is nearly, not quite, normal" });
    expectClose(high, 0.34610292, { rel: 1e-4, because: "ln(core/mantle) is nearly, not quite, normal" });
  });

  it("has no width without errors", () => {
    const { coreMassFraction: cmf, logCoreToMantle } = planetFromStar(parseAbundances("Fe/Mg=0.81,Si/Mg=0.91"));
    expect(cmf.low).toBe(cmf.mean);
    expect(cmf.high).toBe(cmf.mean);
    expect(logCoreToMantle.sigma).toBe(0);
  });

  it("keeps iron in the mantle on request, conserving it", () => {
    const { mantle, coreMassFraction } = planetFromStar(parseAbundances("Fe/Mg=0.8,Si/Mg=0.9"), 0.1);
    expectClose(mantle.ironNumber, 0.08 / 1.08, { rel: 1e-13, because: "closed form" });
    expectClose(mantle.magnesiumToSilicon, 1 / 0.9, { rel: 1e-13, because: "closed form" });
    const core = 0.72 * 55.845;
    const rock = 40.304 + 0.9 * 60.083 + 0.08 * 71.844;
    expectClose(coreMassFraction.mean, core / (core + rock), { rel: 1e-13, because: "closed form" });
  });

  it.each([-0.1, 1, Number.NaN])("refuses the mantle iron share %d", (share) => {
    expect(() => planetFromStar(only(["Fe", "Mg", "Si"]), share)).toThrow(
      expect.objectContaining({ code: "mantle-iron-share" }),
    );
  });
});
