import { describe, expect, it } from "vitest";
import {
  equilibriumTemperature,
  escapeParameter,
  radiusWithAtmosphere,
  radiusWithoutAtmosphere,
  scaleHeight,
} from "../../src/envelope/atmosphere.ts";
import { EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

describe("atmosphere", () => {
  it("puts the Earth's black-sphere temperature at 278 K", () => {
    expectClose(equilibriumTemperature(1361), 278.3, {
      rel: 2e-4,
      because: "four digits; textbooks have 278 to 279 K",
    });
  });

  it("scales like the Earth's atmosphere with another gas", () => {
    // Scale height of air at 288 K on the Earth: 8.43 km (U.S. Standard Atmosphere 1976: 8434.5 m), molar mass 28.9644 g.
    expectClose((scaleHeight(EARTH_MASS, 6.371e6, 288.15) * 2.35) / 28.9644, 8434.5, {
      rel: 3e-3,
      because: "standard gravity 9.80665 against 9.82 m/s²",
    });
  });

  it("is removed exactly as it was added", () => {
    const radius = radiusWithAtmosphere(6 * EARTH_MASS, 2.2 * EARTH_RADIUS, 900);
    expect(radius).toBeGreaterThan(2.25 * EARTH_RADIUS);
    expectClose(radiusWithoutAtmosphere(6 * EARTH_MASS, radius, 900), 2.2 * EARTH_RADIUS, {
      rel: 1e-14,
      because: "quadratic solved",
    });
  });

  it("measures escape against heat", () => {
    // 7.57 Λ units: G M⊕ m_H/(k 1000 K R⊕) = 6.2568e7 J/kg × 1.008e-3 / 8314.46.
    expectClose(escapeParameter(EARTH_MASS, 6.3781e6, 1000), (3.986004e14 / 6.3781e6) * (1.008e-3 / 8314.4626), {
      rel: 1e-7,
      because: "definition",
    });
  });
});
