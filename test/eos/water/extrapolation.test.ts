import { expect, test } from "vitest";
import { fluidDensity } from "../../../src/eos/water/fluidDensity.ts";
import { fluidState } from "../../../src/eos/water/fluidState.ts";
import { iceVIIState } from "../../../src/eos/water/iceVII.ts";
import { highPressureMelting } from "../../../src/eos/water/phaseDiagram.ts";

/** Water at room temperature and pressure. */
const initial = fluidState(998.2, 293.15);

/** Pressure [Pa] of IAPWS-95 on the Hugoniot at a compression, by bisection in temperature. */
function hugoniotPressure(compression: number): number {
  const density = compression * initial.density;
  let [cold, hot] = [290, 20000];
  for (let i = 0; i < 60; i++) {
    const middle = 0.5 * (cold + hot);
    const { internalEnergy, pressure } = fluidState(density, middle);
    const work = 0.5 * (pressure + initial.pressure) * (1 / initial.density - 1 / density);
    if (internalEnergy - initial.internalEnergy < work) cold = middle;
    else hot = middle;
  }
  return fluidState(density, cold).pressure;
}

/** Compression on the fit of Steinberg 1987: U = 1.48 km/s + 2.56 u - 1.986 u^2/U + 0.2268 u^3/U^2 (from memory). */
function measuredCompression(pressure: number): number {
  let [low, high] = [0, 0.7];
  for (let i = 0; i < 60; i++) {
    const q = 0.5 * (low + high);
    const speed = 1480 / (1 - 2.56 * q + 1.986 * q ** 2 - 0.2268 * q ** 3);
    if (initial.density * speed ** 2 * q < pressure) low = q;
    else high = q;
  }
  return 1 / (1 - low);
}

test.each([
  [1.3, 1.7, 0.0135],
  [1.5, 5.5, 0.0036],
  [1.7, 13, -0.0063],
  [1.9, 26, -0.0143],
  [2.15, 49, -0.0288],
  [2.4, 84, -0.0629],
])("at compression %s (%s GPa) the density differs from the shock fit by %s", (compression, gpa, difference) => {
  const pressure = hugoniotPressure(compression);
  expect(Math.abs(pressure / 1e9 / gpa - 1)).toBeLessThan(0.02);
  expect(compression / measuredCompression(pressure) - 1).toBeCloseTo(difference, 3);
});

test("along the melting curve to 80 GPa the extrapolated fluid stays lighter than the ice, by 5 to 15 %", () => {
  for (const temperature of [360, 450, 550, 650, 750, 900, 1100, 1300]) {
    const pressure = highPressureMelting(temperature)?.pressure(temperature) as number;
    const ratio = fluidDensity(pressure, temperature, "dense") / iceVIIState(pressure, temperature).density;
    expect(ratio).toBeGreaterThan(0.85);
    expect(ratio).toBeLessThan(0.95);
  }
});
