import { ModelRangeError } from "../../errors.ts";
import { isentropicState } from "./isentropicState.ts";
import { IsothermBasedEos } from "./isothermBasedEos.ts";
import type { ThermalEos, ThermalState } from "./thermalState.ts";
import { type Path, PathCurve, type WarmCurve } from "./warmCurve.ts";

/**
 * The curve of constant entropy through an anchor, which serves as an adiabat of a well-mixed layer.
 * Units   Pa, K
 * Throws  ModelRangeError as `ThermalEos.at`, for the anchor
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export function isentrope(eos: ThermalEos, anchorPressure: number, anchorTemperature: number): WarmCurve {
  const anchor = eos.at(anchorPressure, anchorTemperature);
  const scale = pressureScale(anchor, anchorPressure);
  const { members } = eos;
  const path: Path = (pressure, near) => {
    // First guess: d ln T/dP = γ/K with constant γ and K = 4 (P + P*).
    const stiffening = (pressure + scale) / ((near?.pressure ?? anchorPressure) + scale);
    const temperature = (near?.temperature ?? anchorTemperature) * stiffening ** (anchor.gruneisen / 4);
    const coordinates = near?.coordinates ?? members.map(({ phase }) => phase.reference.invert(pressure));
    return { pressure, ...isentropicState(members, pressure, anchor.entropy, { temperature, coordinates }) };
  };
  return pathCurve(eos, path, anchorPressure, scale);
}

/**
 * The curve of constant temperature [K]; at the reference temperature of a phase its cold curve itself.
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export function isotherm(eos: ThermalEos, temperature: number, fromPressure = 0): WarmCurve {
  if (eos instanceof IsothermBasedEos && eos.referenceTemperature === temperature) {
    const cold = eos.reference;
    return {
      minPressure: cold.minPressure,
      maxPressure: eos.maxPressure,
      pressure: (y) => cold.pressure(y),
      density: (y) => cold.density(y),
      slopes: (y, out) => cold.slopes(y, out),
      coordinate: (pressure) => cold.coordinate(pressure),
      invert: (pressure) => cold.invert(pressure),
      coordinateAtDensity: (density) => cold.coordinateAtDensity(density),
      temperature: () => temperature,
    };
  }
  return alongTemperature(eos, () => temperature, { fromPressure });
}

/**
 * The curve along a given temperature [K] of pressure [Pa].
 * `kinks` are the pressures where the temperature is not smooth (the rows of a table), ascending.
 * Checked test/eos/thermal/temperaturePaths.test.ts
 */
export function alongTemperature(
  eos: ThermalEos,
  temperatureAt: (pressure: number) => number,
  options: { fromPressure?: number; kinks?: readonly number[] } = {},
): WarmCurve {
  const { fromPressure = 0, kinks } = options;
  const start = eos.at(fromPressure, temperatureAt(fromPressure));
  const path: Path = (pressure) => {
    const temperature = temperatureAt(pressure);
    return { pressure, density: eos.at(pressure, temperature).density, temperature };
  };
  return pathCurve(eos, path, fromPressure, pressureScale(start, fromPressure), kinks);
}

/** P* of K = 4 (P + P*), kept positive where compression has made K/P smaller than 4. */
function pressureScale({ bulkModulusT }: ThermalState, pressure: number): number {
  return Math.max(bulkModulusT / 4 - pressure, bulkModulusT / 20);
}

/** A path begins at zero pressure where the substance can be decompressed that far, else where it is anchored. */
function pathCurve(
  eos: ThermalEos,
  path: Path,
  anchorPressure: number,
  scale: number,
  kinks?: readonly number[],
): WarmCurve {
  const minPressure = reachesZero(path) ? 0 : anchorPressure;
  return new PathCurve(path, {
    minPressure,
    maxPressure: eos.maxPressure,
    startPressure: anchorPressure,
    scale,
    kinks,
  });
}

function reachesZero(path: Path): boolean {
  try {
    path(0);
    return true;
  } catch (error) {
    if (error instanceof ModelRangeError) return false;
    throw error;
  }
}
