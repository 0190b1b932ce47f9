import { ModelRangeError } from "../../errors.ts";
import { fluidLimits } from "./fluidDensity.ts";
import { COLDEST, type WaterBoundary, type WaterPhaseName, waterBoundaries } from "./phaseBoundaries.ts";

/** The boundary where a phase ends towards higher pressure at a temperature [K]; undefined for ice VII, which has none. */
export function upperBoundary(phase: WaterPhaseName, temperature: number): WaterBoundary | undefined {
  return waterBoundaries.find((b) => b.below === phase && temperature >= b.coldest && temperature < b.warmest);
}

/** The melting curve of the ice that a liquid freezes to under pressure at a temperature [K]; undefined below 251.165 K. */
export function highPressureMelting(temperature: number): WaterBoundary | undefined {
  return waterBoundaries.find(
    (b) => (b.below === "liquid" || b.below === "supercritical") && temperature >= b.coldest && temperature < b.warmest,
  );
}

/**
 * The stable phase of water at a pressure [Pa] and temperature [K]. "ice-VII" stands also for ices VIII and X,
 * "supercritical" for any fluid above both critical values.
 * Valid   50-5000 K; solid-solid lines below 200 K and melting above 715 K are extrapolations, see phaseBoundaries.ts
 * Throws  ModelRangeError `water-temperature-range`, `water-pressure-range`
 * Checked known states, triple points: test/eos/water/phaseDiagram.test.ts
 */
export function waterPhase(pressure: number, temperature: number): WaterPhaseName {
  requireDiagramTemperature(temperature);
  if (!(pressure >= 0 && pressure < Number.POSITIVE_INFINITY)) {
    throw new ModelRangeError(
      "water-pressure-range",
      `Pressure ${pressure} Pa is not one water can have; give a finite pressure of 0 Pa or more.`,
      { quantity: "pressure", value: pressure, minimum: 0 },
    );
  }
  let phase: WaterPhaseName = "vapour";
  let boundary = upperBoundary(phase, temperature);
  while (boundary !== undefined && pressure >= boundary.pressure(temperature)) {
    phase = boundary.above;
    boundary = upperBoundary(phase, temperature);
  }
  return phase;
}

export function requireDiagramTemperature(temperature: number): void {
  if (temperature >= COLDEST && temperature < fluidLimits.maxTemperature) return;
  throw new ModelRangeError(
    "water-temperature-range",
    `Temperature ${temperature} K is outside the phase diagram of water, which covers ${COLDEST} to ${fluidLimits.maxTemperature} K.`,
    { quantity: "temperature", value: temperature, minimum: COLDEST, maximum: fluidLimits.maxTemperature },
  );
}
