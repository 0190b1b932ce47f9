import { describe, expect, it } from "vitest";
import { endMembers as table } from "../../src/mineralogy/endMembers.ts";
import { ironAnalogue, ironAnalogues } from "../../src/mineralogy/ironAnalogues.ts";
import { expectClose } from "../support/expectClose.ts";

describe("ironAnalogue", () => {
  it.each([
    ["fayalite", table.forsterite, table.fayalite],
    ["Fe-bridgmanite", table.mgBridgmanite, table.feBridgmanite],
    ["Fe-post-perovskite", table.mgPostPerovskite, table.fePostPerovskite],
    ["wüstite", table.periclase, table.wustite],
  ])("would give %s within the stated 1.4 %", (name, magnesium, iron) => {
    const analogue = ironAnalogue(name, magnesium, [table.mgRingwoodite, table.feRingwoodite]);
    expectClose(analogue.volumeCm3PerMol, iron.volumeCm3PerMol, { rel: 0.014, because: "stated in its comment" });
    expect(analogue.formula).toBe(iron.formula);
  });

  it("counts exchanged atoms, not formula units", () => {
    // Four atoms of majorite against two of ringwoodite: 114.324 + 2 × 2.367.
    expectClose(ironAnalogues.feMajorite.volumeCm3PerMol, 119.058, { rel: 1e-12, because: "sum" });
    expect(ironAnalogues.feMajorite.formula).toBe("Fe4Si4O12");
    expect(ironAnalogues.ferrosilite.source.note).toMatch(/not published/);
  });
});
