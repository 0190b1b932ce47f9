import { describe, expect, it } from "vitest";
import { isentrope } from "../../src/eos/thermal/temperaturePaths.ts";
import { warmStack } from "../../src/eos/thermal/warmStack.ts";
import { mantlePhases } from "../../src/mineralogy/mantlePhases.ts";
import { GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

// Mg/Si and iron number of the Earth's upper mantle: McDonough & Sun 1995, Chem. Geol. 120, 223 (from memory).
const stack = warmStack(mantlePhases({ magnesiumToSilicon: 1.25, ironNumber: 0.107 }), isentrope, 0, 1600);

function at(pressure: number): { density: number; temperature: number; phase: string } {
  const phase = stack.findLast(({ fromPressure }) => pressure >= fromPressure) ?? stack[0];
  const y = phase.curve.coordinate(pressure);
  return { density: phase.curve.density(y), temperature: phase.curve.temperature(y), phase: phase.name };
}

describe("a mantle of the Earth's composition on a 1600 K adiabat", () => {
  // PREM (Dziewonski & Anderson 1981): pressure integrated from its density polynomials, density in g/cm³.
  it.each([
    [7.1156, 3.4358],
    [21.056, 3.9758],
    [28, 4.45],
    [135.8375, 5.5665],
  ])("has PREM's density at %d GPa", (pressure, density) => {
    expectClose(at(pressure * GPA).density / 1000, density, {
      rel: 0.025,
      because: "aluminium and calcium are left out, and PREM is smooth where minerals are not",
    });
  });

  it("runs through all five domains with the temperature of an adiabat", () => {
    expect(stack.map(({ name }) => name)).toEqual([
      "olivine",
      "wadsleyite",
      "ringwoodite",
      "bridgmanite",
      "post-perovskite",
    ]);
    // Brown & Shankland 1981, Geophys. J. R. astr. Soc. 66, 579: about 2450 K at the base from 1600 K (from memory).
    expectClose(at(130 * GPA).temperature, 2450, { rel: 0.06, because: "no latent heat, other minerals" });
  });

  it("says what is in each domain, and where post-perovskite is no more", () => {
    expect(stack[0].source.note).toMatch(/forsterite, fayalite, enstatite/);
    expect(stack[4].source.note).toMatch(/900 GPa/);
  });
});
