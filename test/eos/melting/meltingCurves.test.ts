import { describe, expect, it } from "vitest";
import { meltingCurves } from "../../../src/eos/melting/meltingCurves.ts";
import { meltingDepression, meltingPressure, meltingTemperature } from "../../../src/eos/melting/meltingTemperature.ts";
import { GPA } from "../../../src/units/constants.ts";
import { expectClose } from "../../support/expectClose.ts";

const at = (name: keyof typeof meltingCurves, gpa: number): number =>
  meltingTemperature(meltingCurves[name], gpa * GPA);

describe("published melting curves", () => {
  it("reach the abstract's 6230 K at the inner-core boundary: Anzellini et al. 2013", () => {
    expectClose(at("ironAnzellini", 330), 6230, { rel: 5e-4, because: "the abstract rounds to 10 K" });
    expect(at("ironAnzellini", 5.2)).toBe(1991);
    // fcc, hcp and liquid meet at 98.5 GPa and 3712 K.
    expectClose(at("ironAnzellini", 98.4999), 3712, { rel: 1e-3, because: "two fitted branches" });
    expect(at("ironAnzellini", 98.5)).toBe(3712);
  });

  it("agree for iron at 330 GPa within the stated 500 K", () => {
    expect(Math.abs(at("ironKraus", 330) - at("ironAnzellini", 330))).toBeLessThan(10);
    expect(Math.abs(at("ironStixrude", 330) - at("ironAnzellini", 330))).toBeLessThan(500);
  });

  it("give the published spread for MgSiO3 at the base of the mantle", () => {
    // Stixrude 2014: liquidus 5321 K and, with x = 0.79, solidus 4306 K; Belonoshko et al. 2005: 5657 K.
    const because = "four digits";
    expectClose(at("silicateStixrude", 135.75), 5321, { rel: 2e-4, because });
    expectClose(at("silicateStixrude", 135.75) * meltingDepression(0.79), 4306, { rel: 2e-4, because });
    expectClose(at("silicateBelonoshko", 135.75), 5657, { rel: 2e-4, because });
    expectClose(at("silicateStixrude", 500), 9949, { rel: 2e-4, because });
    expectClose(at("silicateBelonoshko", 500), 8629, { rel: 2e-4, because });
  });

  it("begin somewhere, and say so", () => {
    expect(() => at("ironKraus", 100)).toThrow(expect.objectContaining({ code: "melting-pressure" }));
    expect(() => at("ironAnzellini", Number.NaN)).toThrow(expect.objectContaining({ code: "melting-pressure" }));
  });
});

describe("meltingPressure", () => {
  it.each(Object.entries(meltingCurves))("inverts %s", (_, curve) => {
    for (const pressure of [5.2, 40, 98.5, 150, 300, 900].map((gpa) => gpa * GPA)) {
      if (pressure < curve.branches[0].fromPressure) continue;
      expectClose(meltingPressure(curve, meltingTemperature(curve, pressure)), pressure, {
        rel: 1e-12,
        because: "closed inverse",
      });
    }
  });

  it("is 0 for anything colder than the curve, and continuous where branches meet", () => {
    expect(meltingPressure(meltingCurves.ironAnzellini, 300)).toBe(0);
    for (const temperature of [3711, 3712, 3713]) {
      expectClose(meltingPressure(meltingCurves.ironAnzellini, temperature), 98.5 * GPA, {
        rel: 2e-3,
        because: "two fitted branches",
      });
    }
  });
});

describe("meltingDepression", () => {
  it("is 1 for the pure substance and falls with dilution", () => {
    expect(meltingDepression(1)).toBe(1);
    expectClose(meltingDepression(Math.exp(-1)), 0.5, { rel: 1e-15, because: "1/(1 + 1)" });
  });

  it.each([0, -0.1, 1.01, Number.NaN])("refuses the mole fraction %d", (x) => {
    expect(() => meltingDepression(x)).toThrow(expect.objectContaining({ code: "melting-mole-fraction" }));
  });
});
