import { describe, expect, it } from "vitest";
import { densityAt } from "../../../src/eos/material.ts";
import { warmMaterial } from "../../../src/eos/thermal/warmMaterial.ts";
import { GPA } from "../../../src/units/constants.ts";
import { bridgmanite, forsterite } from "../../support/thermalSubstances.ts";

const source = { citation: "invented for the test" };
const material = warmMaterial("rock", "Rock", [
  { name: "low", form: "test", eos: forsterite, stableFrom: () => 0, calibratedTo: GPA, source },
  { name: "high", form: "test", eos: bridgmanite, stableFrom: () => 23 * GPA, calibratedTo: GPA, source },
]);

const temperatures = (phases: ReturnType<NonNullable<typeof material.warmed>>, pressures: number[]) =>
  pressures.map((pressure) => {
    const { curve } = phases.findLast(({ fromPressure }) => pressure >= fromPressure) ?? phases[0];
    return curve.temperature?.(curve.coordinate(pressure));
  });

describe("warmMaterial", () => {
  it("is its cold curves as a cold material", () => {
    for (const [pressure, eos] of [
      [10 * GPA, forsterite],
      [60 * GPA, bridgmanite],
    ] as const) {
      const cold = eos.reference;
      expect(densityAt(material, pressure)).toBe(cold.density(cold.coordinate(pressure)));
    }
  });

  it("follows each mode of temperature", () => {
    const pressures = [5 * GPA, 60 * GPA];
    expect(temperatures(material.warmed?.({ kind: "isothermal" }, 0, 1500) ?? [], pressures)).toEqual([1500, 1500]);
    const [upper, lower] = temperatures(material.warmed?.({ kind: "adiabatic" }, 0, 1500) ?? [], pressures);
    expect(upper).toBeGreaterThan(1500);
    expect(lower).toBeGreaterThan(upper ?? Number.NaN);
    const table = { kind: "table", temperatureAt: (p: number) => 1000 + 2e-8 * p, kinks: [] } as const;
    const given = temperatures(material.warmed?.(table, 0, 0) ?? [], pressures);
    expect(given[0]).toBeCloseTo(1100, 6);
    expect(given[1]).toBeCloseTo(2200, 6);
  });
});
