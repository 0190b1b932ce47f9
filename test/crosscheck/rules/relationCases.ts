import { planetRow } from "../planetRow.ts";
import type { RuleCase } from "./ruleCase.ts";

/** The Earth and Jupiter as lists would give them; values from memory of the NASA planetary fact sheets. */
const earth = { mass: [1, 0.01], radius: [0.99887, 0.001], period: 365.25, semiMajorAxis: 1 } as const;
const sun = { starMass: 1, starRadius: 1, starTemperature: 5772 } as const;

const fires = (values: Parameters<typeof planetRow>[0], severity: "warning" | "error", why: string) => ({
  why,
  rows: [planetRow(values)],
  severity,
});
const silent = (values: Parameters<typeof planetRow>[0], why: string) => ({ why, rows: [planetRow(values)] });

export const relationCases: readonly RuleCase[] = [
  {
    rule: "density-mass-radius",
    fires: [
      fires({ ...earth, density: [5514 * 1.5, 100] }, "warning", "1.5 times the Earth's density"),
      fires({ ...earth, density: 5514 * 3 }, "error", "3 times the Earth's density, no error given"),
    ],
    silent: [
      silent({ ...earth, density: [5514, 10] }, "the Earth's density"),
      silent({ ...earth, density: [5514 * 1.5, 1200] }, "1.5 times within 4 sigma"),
      silent({ ...earth, mass: [1, undefined, { kind: "upper-limit" }], density: [50, 1] }, "the mass is a limit"),
    ],
  },
  {
    rule: "gravity-mass-radius",
    fires: [fires({ ...earth, surfaceGravity: 4.44 * 10 }, "error", "four times the Earth's gravity")],
    silent: [silent({ ...earth, surfaceGravity: 9.82 }, "the Earth's gravity")],
  },
  {
    rule: "kepler-third-law",
    fires: [
      fires({ ...earth, ...sun, semiMajorAxis: 1.5 }, "error", "the Earth's year at 1.5 au"),
      fires(
        { ...earth, period: [365.25, 0.1], semiMajorAxis: [1, 0.01], starMass: [1.3, 0.03] },
        "warning",
        "the Earth's orbit around 1.3 suns",
      ),
    ],
    silent: [
      silent({ ...earth, ...sun }, "the Earth's orbit"),
      silent(
        { mass: [333_000, 3_000], period: 258.27, semiMajorAxis: [1, 0.001], starMass: [1, 0.01] },
        "two suns at 1 au: the companion's mass counts",
      ),
    ],
  },
  {
    rule: "insolation-star-orbit",
    fires: [fires({ ...earth, ...sun, insolation: 3000 }, "error", "twice the Earth's insolation")],
    silent: [
      silent({ ...earth, ...sun, insolation: 1361 }, "the Earth's insolation"),
      silent({ ...earth, ...sun, insolation: 3000, eccentricity: 0.5 }, "an orbit that comes near enough"),
    ],
  },
  {
    rule: "temperature-star-orbit",
    fires: [
      fires({ ...earth, ...sun, equilibriumTemperature: 800 }, "error", "800 K at the Earth"),
      fires({ ...earth, ...sun, equilibriumTemperature: 120 }, "warning", "a temperature of Jupiter's at the Earth"),
    ],
    silent: [
      silent({ ...earth, ...sun, equilibriumTemperature: 254 }, "the Earth's black-body temperature, albedo 0.3"),
      silent({ ...earth, ...sun, semiMajorAxis: 0.7233, equilibriumTemperature: 227 }, "Venus's, albedo 0.77"),
    ],
  },
  {
    rule: "temperature-insolation",
    fires: [fires({ insolation: 1361, equilibriumTemperature: 800 }, "error", "800 K from the Earth's insolation")],
    silent: [silent({ insolation: 1361, equilibriumTemperature: 254 }, "the Earth")],
  },
  {
    rule: "radius-ratio",
    fires: [
      fires({ radius: 1, starRadius: 1, radiusRatio: [0.0917, 0.001] }, "error", "a ratio ten times the Earth's"),
    ],
    silent: [silent({ radius: 1, starRadius: 1, radiusRatio: [0.00917, 0.0001] }, "the Earth's transit")],
  },
  {
    rule: "scaled-axis",
    fires: [fires({ semiMajorAxis: 1, starRadius: 1, scaledAxis: [300, 3] }, "warning", "300 solar radii to an au")],
    silent: [silent({ semiMajorAxis: 1, starRadius: 1, scaledAxis: [215, 3] }, "215 solar radii to an au")],
  },
  {
    rule: "star-density",
    fires: [fires({ ...sun, starDensity: [5000, 100] }, "error", "the Sun as dense as the Earth")],
    silent: [silent({ ...sun, starDensity: [1410, 10] }, "the Sun's density")],
  },
  {
    rule: "star-density-transit",
    fires: [fires({ scaledAxis: [215, 3], period: 365.25, starDensity: [3000, 30] }, "error", "twice the Sun's")],
    silent: [
      silent({ scaledAxis: [215, 3], period: 365.25, starDensity: [1410, 10] }, "the Sun's, from the Earth's transit"),
      silent(
        { scaledAxis: [215, 3], period: 365.25, starDensity: [3000, 30], eccentricity: 0.3 },
        "an eccentric orbit can double it",
      ),
    ],
  },
  {
    rule: "velocity-amplitude",
    fires: [
      fires(
        { minimumMass: [317.8, 1], starMass: 1, period: 4332.6, velocityAmplitude: [28.4, 0.5] },
        "error",
        "a radian",
      ),
    ],
    silent: [
      silent(
        { minimumMass: [317.8, 1], starMass: 1, period: 4332.6, velocityAmplitude: [12.5, 0.1] },
        "Jupiter's 12.5 m/s",
      ),
    ],
  },
  {
    rule: "mass-below-minimum",
    fires: [fires({ mass: [5, 0.2], minimumMass: [8, 0.2] }, "warning", "lighter than its minimum mass")],
    silent: [
      silent({ mass: [5, 0.2], minimumMass: [2, 0.2] }, "heavier than its minimum mass"),
      silent({ mass: [5, 1], minimumMass: [6, 1] }, "within the errors"),
    ],
  },
  {
    // A body that fills its Roche lobe has P √ρ = 10.5 h √(g/cm³): Faulkner, Flannery & Warner 1972, ApJ 175, L79 (from memory).
    rule: "roche-density",
    fires: [fires({ mass: [1, 0.01], radius: [1.767, 0.01], period: 9 / 24 }, "warning", "1 g/cm³ in 9 hours")],
    silent: [silent({ mass: [1, 0.01], radius: [1.767, 0.01], period: 11 / 24 }, "1 g/cm³ in 11 hours")],
  },
  {
    rule: "unit-slip",
    fires: [
      fires(
        { ...earth, radius: [11.2, 0.1], density: 5514, surfaceGravity: 9.82 },
        "error",
        "radius 11.2 times too large",
      ),
      fires({ ...earth, ...sun, period: 365.25 * 24 }, "error", "days read as hours"),
    ],
    silent: [
      silent({ ...earth, ...sun, density: 5514 }, "the Earth"),
      silent({ ...earth, density: 5514 * 3 }, "a factor 3 is between no units"),
      silent(
        { ...earth, density: 5514 * 1000, surfaceGravity: 9.82 * 4, radiusRatio: 1, ...sun },
        "no single slip mends all",
      ),
    ],
  },
];
