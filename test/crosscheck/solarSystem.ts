import { readFileSync } from "node:fs";
import type { PlanetRow, QuantityName } from "../../src/planets/quantity.ts";
import { constants, EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { planetRow, type Written } from "./planetRow.ts";

const file = new URL("../fixtures/crosscheck/solar-system.csv", import.meta.url);

/** The Sun's own columns, as a list of exoplanets would repeat them: IAU 2015 B3 nominal values, mean density 1410. */
const sun: Partial<Record<QuantityName, Written>> = {
  starMass: 1,
  starRadius: 1,
  starTemperature: 5772,
  starDensity: 1410,
  starSurfaceGravity: 274,
};

/** The eight planets of the fixture; with the published errors where `errors` is set. */
export function solarSystem({ errors }: { errors: boolean }): PlanetRow[] {
  const [, ...lines] = readFileSync(file, "utf8").trim().split("\n");
  return lines.map((line, index) => {
    const [name = "", ...cells] = line.split(",");
    const [
      mass,
      massError,
      radius,
      radiusError,
      density,
      gravity,
      period,
      axis,
      eccentricity,
      temperature,
      irradiance,
    ] = cells.map(Number) as [number, number, number, number, number, number, number, number, number, number, number];
    const axisAu = (axis * 1e9) / constants.astronomicalUnit.value;
    const radii = (radius * 1e3) / EARTH_RADIUS;
    const with_ = (value: number, error: number): Written => (errors && error > 0 ? [value, error] : value);
    return planetRow(
      {
        mass: with_((mass * 1e24) / EARTH_MASS, (massError * 1e24) / EARTH_MASS),
        radius: with_(radii, (radiusError * 1e3) / EARTH_RADIUS),
        density: density * 1e3,
        surfaceGravity: gravity,
        period,
        semiMajorAxis: axisAu,
        eccentricity,
        equilibriumTemperature: temperature,
        insolation: irradiance,
        radiusRatio: (radius * 1e3) / constants.sunRadius.value,
        scaledAxis: (axis * 1e9) / constants.sunRadius.value,
        ...sun,
      },
      { name, status: "Confirmed" },
      index + 1,
    );
  });
}
