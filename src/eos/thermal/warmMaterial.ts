import type { Material, TemperatureMode } from "../material.ts";
import { alongTemperature, isentrope, isotherm } from "./temperaturePaths.ts";
import { type TemperaturePath, type WarmPhase, warmStack } from "./warmStack.ts";

/** Temperature of a cold planet [K], that of the laboratory. */
const ROOM_TEMPERATURE = 300;

/**
 * A material whose phases know temperature; as a cold material it is its 300 K isotherm.
 * Checked test/eos/thermal/warmMaterial.test.ts
 */
export function warmMaterial(name: string, title: string, phases: readonly WarmPhase[]): Material {
  return {
    name,
    title,
    phases: warmStack(phases, pathOf({ kind: "isothermal" }), 0, ROOM_TEMPERATURE),
    warmed: (mode, topPressure, topTemperature) => warmStack(phases, pathOf(mode), topPressure, topTemperature),
  };
}

function pathOf(mode: TemperatureMode): TemperaturePath {
  switch (mode.kind) {
    case "adiabatic":
      return isentrope;
    case "isothermal":
      return (eos, anchorPressure, anchorTemperature) => isotherm(eos, anchorTemperature, anchorPressure);
    case "table":
      return (eos, anchorPressure) =>
        alongTemperature(eos, mode.temperatureAt, { fromPressure: anchorPressure, kinks: mode.kinks });
  }
}
