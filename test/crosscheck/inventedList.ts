import type { PlanetRow, QuantityName } from "../../src/planets/quantity.ts";
import {
  constants,
  EARTH_MASS,
  EARTH_RADIUS,
  G,
  JUPITER_MASS,
  JUPITER_RADIUS,
  SUN_MASS,
  SUN_RADIUS,
} from "../../src/units/constants.ts";
import { planetRow, quantity, type Written } from "./planetRow.ts";

/** Uniform numbers in (0, 1), the same on every machine: Park & Miller 1988, CACM 31, 1192. */
export function randomNumbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

const digits = (value: number, count = 5) => Number(value.toPrecision(count));

/**
 * A clean row of an invented list: an orbit by Kepler's law, a rocky to gaseous planet, and every derived column
 * computed from what "nature" holds, then each value scattered by its own error as an independent measurement.
 */
export function cleanRow(row: number, random: () => number): PlanetRow {
  const normal = () => Math.sqrt(-2 * Math.log(random())) * Math.cos(2 * Math.PI * random());
  const logUniform = (low: number, high: number) => low * (high / low) ** random();
  const measure = (value: number, relative: number): Written => {
    const error = value * relative;
    return [
      digits(value + error * normal(), 3 - Math.round(Math.log10(relative))),
      digits(error * (0.8 + 0.4 * random()), 3),
    ];
  };
  const star = { mass: logUniform(0.3, 1.6), radius: logUniform(0.3, 1.8), temperature: logUniform(3200, 6800) };
  const mass = logUniform(0.5, 300);
  const density = mass < 8 ? logUniform(3000, 7000) : logUniform(400, 2500);
  const radius = Math.cbrt((3 * mass * EARTH_MASS) / (4 * Math.PI * density)) / EARTH_RADIUS;
  const period = logUniform(1.5, 300);
  const orbit = (G * star.mass * SUN_MASS * (period * constants.day.value) ** 2) / (4 * Math.PI ** 2);
  const axis = Math.cbrt(orbit) / constants.astronomicalUnit.value;
  const scaledAxis = Math.cbrt(orbit) / (star.radius * SUN_RADIUS);
  const albedo = 0.4 * random();
  return planetRow(
    {
      mass: measure(mass, 0.08),
      radius: measure(radius, 0.03),
      density: measure(density, 0.12),
      surfaceGravity: measure((G * mass * EARTH_MASS) / (radius * EARTH_RADIUS) ** 2, 0.1),
      period: measure(period, 1e-5),
      semiMajorAxis: measure(axis, 0.01),
      inclination: measure(88.5, 0.003),
      equilibriumTemperature: measure((star.temperature * (1 - albedo) ** 0.25) / Math.sqrt(2 * scaledAxis), 0.03),
      insolation: measure((constants.stefanBoltzmann.value * star.temperature ** 4) / scaledAxis ** 2, 0.08),
      radiusRatio: measure((radius * EARTH_RADIUS) / (star.radius * SUN_RADIUS), 0.015),
      scaledAxis: measure(scaledAxis, 0.02),
      starMass: measure(star.mass, 0.03),
      starRadius: measure(star.radius, 0.02),
      starTemperature: measure(star.temperature, 0.015),
      starDensity: measure((3 * star.mass * SUN_MASS) / (4 * Math.PI * (star.radius * SUN_RADIUS) ** 3), 0.07),
    },
    { name: `Ostara-${row} b`, discoveryMethod: "Transit", status: "Confirmed" },
    row,
  );
}

/** The row with its Jupiter-unit twins, as an archive that converts adds them. */
export function withTwins(row: PlanetRow): PlanetRow {
  const twin = (name: QuantityName, unit: number) => {
    const value = row.quantities[name]?.value ?? Number.NaN;
    const written = String(digits(value / unit));
    return [{ ...quantity(name, 1), value: Number(written) * unit, written }];
  };
  return { ...row, twins: { mass: twin("mass", JUPITER_MASS), radius: twin("radius", JUPITER_RADIUS) } };
}
