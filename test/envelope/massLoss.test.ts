import { describe, expect, it } from "vitest";
import { highEnergyFlux, massLossTime } from "../../src/envelope/massLoss.ts";
import { constants, EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

const GYR = 1e9 * constants.julianYear.value;

describe("highEnergyFlux", () => {
  it("is steady, then fades", () => {
    expect(highEnergyFlux(1000, 0.01 * GYR)).toBe(highEnergyFlux(1000, 0.1 * GYR));
    expectClose(highEnergyFlux(1000, 0.1 * GYR), 1000 * 10 ** -3.5, { rel: 1e-14, because: "saturated share" });
    expectClose(highEnergyFlux(1000, 1.6 * GYR) / highEnergyFlux(1000, 0.4 * GYR), 1 / 8, {
      rel: 1e-13,
      because: "4^-1.5",
    });
  });

  it("has the Sun's order of magnitude today", () => {
    // Ribas et al. 2005, ApJ 622, 680: 4.6 erg/(s cm²) at 1 au between 0.1 and 120 nm (from memory), 4.6e-3 W/m².
    const today = highEnergyFlux(1361, 4.57 * GYR);
    expect(today / 4.6e-3).toBeGreaterThan(0.2);
    expect(today / 4.6e-3).toBeLessThan(5);
  });
});

describe("massLossTime", () => {
  it("is binding energy over heating", () => {
    const planet = {
      mass: 5 * EARTH_MASS,
      radius: 2 * EARTH_RADIUS,
      envelopeMass: 0.02 * EARTH_MASS,
      highEnergyFlux: 1,
    };
    const time = massLossTime(planet);
    // Energy G M M_env/R against η times the power on the disc π R².
    const energy = (6.6743e-11 * planet.mass * planet.envelopeMass) / planet.radius;
    expectClose(time, energy / (0.1 * Math.PI * planet.radius ** 2), {
      rel: 1e-13,
      because: "same energy, other grouping",
    });
    expectClose(massLossTime({ ...planet, efficiency: 0.2 }), time / 2, { rel: 1e-14, because: "proportional" });
  });
});
