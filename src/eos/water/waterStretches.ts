import type { BarotropePath } from "./barotropePiece.ts";
import type { PathPoint, Stretch } from "./barotropeStretch.ts";
import { fluidLimits } from "./fluidDensity.ts";
import type { WaterBoundary, WaterPhaseName } from "./phaseBoundaries.ts";
import { highPressureMelting, upperBoundary } from "./phaseDiagram.ts";
import { waterPhases } from "./waterPhases.ts";

export type PhaseAt = (at: PathPoint) => WaterPhaseName;
type Gradient = BarotropePath["gradient"];

/** With P + K/4 as coordinate, about P + K/K', the density of condensed matter is nearly a power of it down to P = 0. */
const CONDENSED_SHIFT = 0.25;
/** Relative distance in pressure below which a point counts as on a melting curve. */
const ON_CURVE = 1e-6;
/** Steepness at which ice leaves its melting curve again, low enough not to come straight back. */
const CLEARLY_LESS = 0.98;

/** The rule to follow from a point on: through its phase, or, where that would overheat ice, along the melting curve. */
export function stretchFrom(foot: PathPoint, gradient: Gradient, phaseAt: PhaseAt): Stretch {
  const melting = highPressureMelting(foot.temperature);
  const onCurve = melting !== undefined && Math.abs(foot.pressure / melting.pressure(foot.temperature) - 1) < ON_CURVE;
  if (!onCurve) return throughPhase(phaseAt(foot), gradient, foot, phaseAt);
  if (steepness(melting, gradient, foot) > 1) return alongMelting(melting, gradient, foot);
  return throughPhase(melting.above, gradient, foot, phaseAt);
}

function throughPhase(phase: WaterPhaseName, gradient: Gradient, foot: PathPoint, phaseAt: PhaseAt): Stretch {
  return {
    name: phase,
    phase,
    path: pathThrough(phase, foot, gradient),
    hasLeft: (at) => at.temperature >= fluidLimits.maxTemperature || phaseAt(at) !== phase,
    // Vapour has no state past saturation. To look no farther than here is enough: an adiabat turns away from it.
    lastPressure: (temperature) =>
      (phase === "vapour" && upperBoundary(phase, temperature)?.pressure(temperature)) || Number.POSITIVE_INFINITY,
  };
}

/**
 * Ice whose adiabat is steeper than its melting curve would melt again deeper down. At constant entropy it then melts
 * little by little and stays on the curve; the path follows it with the density of the ice.
 */
function alongMelting(melting: WaterBoundary, gradient: Gradient, foot: PathPoint): Stretch {
  const phase = melting.above;
  return {
    name: `${phase} at its melting point`,
    phase,
    path: pathThrough(phase, foot, (_, temperature) => 1 / pressureSlope(melting, temperature)),
    hasLeft: (at) => {
      const here = highPressureMelting(at.temperature);
      return here?.above !== phase || steepness(here, gradient, at) < CLEARLY_LESS;
    },
    lastPressure: () => Number.POSITIVE_INFINITY,
  };
}

/** dT/dP along the path in the ice over that of its melting curve; above 1 the ice would melt. */
function steepness(melting: WaterBoundary, gradient: Gradient, at: PathPoint): number {
  const state = waterPhases[melting.above].state(at.pressure, at.temperature);
  return gradient(state, at.temperature) * pressureSlope(melting, at.temperature);
}

/** dP/dT of a boundary [Pa K^-1] by differences, good to 1e-8: it sets the temperature along melting ice, no more. */
function pressureSlope(boundary: WaterBoundary, temperature: number): number {
  const step = 1e-5 * temperature;
  return (boundary.pressure(temperature + step) - boundary.pressure(temperature - step)) / (2 * step);
}

function pathThrough(phase: WaterPhaseName, foot: PathPoint, gradient: Gradient): BarotropePath {
  const { state } = waterPhases[phase];
  const gasLike = phase === "vapour" || phase === "supercritical";
  const shift = gasLike ? 0 : CONDENSED_SHIFT * state(foot.pressure, foot.temperature).isothermalBulkModulus;
  return { state, gradient, shift };
}
