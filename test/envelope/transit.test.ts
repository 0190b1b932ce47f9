import { describe, expect, it } from "vitest";
import { scaleHeight } from "../../src/envelope/atmosphere.ts";
import { radiusAtPressure, TRANSIT_PRESSURE, transitPressure } from "../../src/envelope/transit.ts";
import { EARTH_MASS, EARTH_RADIUS, G } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

const planet = { mass: 10 * EARTH_MASS, radius: 3 * EARTH_RADIUS };
const temperature = 500;
const H = scaleHeight(planet.mass, planet.radius, temperature);

describe("radiusAtPressure", () => {
  const at = (pressure: number): number => radiusAtPressure(planet, temperature, pressure);

  it("is the planet's radius at the transit pressure, and one scale height further out at a part in e", () => {
    expectClose(at(TRANSIT_PRESSURE), planet.radius, { rel: 1e-15, because: "by definition" });
    expectClose(at(TRANSIT_PRESSURE / Math.E) - planet.radius, H, {
      rel: 1.1 * (H / planet.radius),
      because: "gravity falls over a scale height",
    });
  });

  it("is in hydrostatic equilibrium of an ideal gas", () => {
    const step = 1e-4;
    for (const pressure of [10, 2000, 1e6]) {
      const slope = (at(pressure * (1 + step)) - at(pressure * (1 - step))) / (2 * step);
      // d ln P/dr = -1/H with the gravity there.
      expectClose(slope, -scaleHeight(planet.mass, at(pressure), temperature), {
        rel: 1e-6,
        because: "central differences",
      });
    }
  });

  it("refuses a pressure that such an atmosphere has nowhere", () => {
    expect(() => radiusAtPressure({ ...planet, mass: EARTH_MASS }, 2000, 1e-4)).toThrow(
      expect.objectContaining({ code: "atmosphere-unbound" }),
    );
  });
});

describe("transitPressure", () => {
  it("is where an opaque disc dims the star as much as the atmosphere itself does", () => {
    // Radius of that disc by direct summation over rings, R² = ∫ 2b (1 - exp(-τ(b))) db, with τ along each chord.
    const opacity = 1e-3;
    const gravity = (G * planet.mass) / planet.radius ** 2;
    // An exponential atmosphere with the pressure 1 Pa at the planet's radius; depth κρ per metre, ρ = P/(gH).
    const density = (r: number): number => Math.exp(-(r - planet.radius) / H) / (gravity * H);
    const chordDepth = (b: number): number => {
      let sum = 0;
      const length = 12 * Math.sqrt(2 * b * H);
      const steps = 400;
      for (let i = 0; i < steps; i++) sum += density(Math.hypot(b, ((i + 0.5) / steps) * length));
      return (2 * opacity * sum * length) / steps;
    };
    const [low, high] = [planet.radius - 15 * H, planet.radius + 15 * H];
    let area = low * low;
    const rings = 3000;
    for (let i = 0; i < rings; i++) {
      const b = low + ((i + 0.5) / rings) * (high - low);
      area += (2 * b * -Math.expm1(-chordDepth(b)) * (high - low)) / rings;
    }
    const disc = Math.sqrt(area);
    const pressureThere = Math.exp(-(disc - planet.radius) / H);
    expectClose(transitPressure(planet, temperature, opacity), pressureThere, {
      rel: 5 * (H / planet.radius),
      because: "terms of order H/R are left out",
    });
  });
});
