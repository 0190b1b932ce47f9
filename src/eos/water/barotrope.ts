import { ConvergenceError, ModelRangeError } from "../../errors.ts";
import type { WarmCurve } from "../thermal/warmCurve.ts";
import type { WarmStackPhase } from "../thermal/warmStack.ts";
import { barotropeCurve } from "./barotropeCurve.ts";
import type { BarotropePath } from "./barotropePiece.ts";
import { followStretch, type PathPoint, type Stretch } from "./barotropeStretch.ts";
import { fluidLimits } from "./fluidDensity.ts";
import { triplePoints, type WaterPhaseName } from "./phaseBoundaries.ts";
import { requireDiagramTemperature, waterPhase } from "./phaseDiagram.ts";
import { isFluid, stableWater, waterPhases } from "./waterPhases.ts";
import { isentropicGradient } from "./waterState.ts";
import { type PhaseAt, stretchFrom } from "./waterStretches.ts";

/** Where ice Ih is exposed to vacuum it sublimes too slowly to matter; its phase is then taken at this pressure. */
const BARE_ICE_PRESSURE = triplePoints.solidLiquidGas.pressure;
/** A state within this relative distance below a boundary's pressure counts as past it. */
const ON_BOUNDARY = 1e-12;
/** Beyond, water dissociates (Pickard, Martinez-Canales & Needs 2013, Phys. Rev. Lett. 110, 245701: 5 TPa) [Pa]. */
const WATER_MAX_PRESSURE = 2e13;
/** More than any path through water has; one that runs along a boundary would cross it for ever. */
const MAX_STRETCHES = 20;

/**
 * The phases of water, lowest pressure first, between two pressures [Pa] at one temperature [K].
 * A start at 0 Pa means ice with nothing above it and needs at most 273.16 K.
 * Fluid water ends at 100 GPa or 5000 K, whatever `toPressure` is: the last curve's `maxPressure` says where.
 * Throws  ModelRangeError `water-temperature-range`, `water-pressure-range`, `water-bare-surface`, `water-fluid-range`;
 *         ConvergenceError `water-barotrope` within about 0.1 K of the critical point
 * Checked test/eos/water/barotrope.test.ts
 */
export function waterIsotherm(
  temperature: number,
  fromPressure: number,
  toPressure = WATER_MAX_PRESSURE,
): WarmStackPhase[] {
  return trace(fromPressure, temperature, toPressure, () => 0);
}

/**
 * The phases of water, lowest pressure first, along the adiabat that leaves a pressure [Pa] and temperature [K] downward.
 * Within a phase dT/dP = alpha T / (rho c_p). Where it meets a boundary the next phase starts at the same temperature:
 * in a layer that convects on both sides, the latent heat is carried through the boundary rather than warming the ice, so
 * temperature is continuous and entropy jumps. Ice that would melt again deeper down stays on its melting curve instead,
 * as a phase of its own. Start, limits, throws and checks as for `waterIsotherm`.
 */
export function waterAdiabat(
  anchorPressure: number,
  anchorTemperature: number,
  toPressure = WATER_MAX_PRESSURE,
): WarmStackPhase[] {
  return trace(anchorPressure, anchorTemperature, toPressure, isentropicGradient);
}

function trace(
  fromPressure: number,
  temperature: number,
  toPressure: number,
  gradient: BarotropePath["gradient"],
): WarmStackPhase[] {
  requirePressures(fromPressure, toPressure);
  requireDiagramTemperature(temperature);
  const phaseAt = phaseFinder(fromPressure);
  if (fromPressure === 0) requireBareIce(phaseAt({ pressure: 0, temperature }), temperature);
  else stableWater(fromPressure, temperature);
  const phases: WarmStackPhase[] = [];
  let foot: PathPoint = { pressure: fromPressure, temperature };
  while (foot.pressure < toPressure && foot.temperature < fluidLimits.maxTemperature) {
    const stretch = stretchFrom(foot, gradient, phaseAt);
    const limit = isFluid(stretch.phase) ? Math.min(toPressure, fluidLimits.maxPressure) : toPressure;
    if (!(foot.pressure < limit)) break;
    const { pieces, end } = followStretch(stretch, foot, limit);
    phases.push(warmPhase(stretch, barotropeCurve(pieces, stretch.path.shift, foot.pressure, end.pressure), end));
    if (phases.length > MAX_STRETCHES) throw tooManyStretches(end);
    foot = end;
  }
  return phases.map((phase, i) =>
    i < phases.length - 1 ? phase : { ...phase, untilPressure: Number.POSITIVE_INFINITY },
  );
}

function phaseFinder(fromPressure: number): PhaseAt {
  const lowest = fromPressure === 0 ? BARE_ICE_PRESSURE : 0;
  return (at) => waterPhase(Math.max(at.pressure, lowest) * (1 + ON_BOUNDARY), at.temperature);
}

function warmPhase(stretch: Stretch, curve: WarmCurve, end: PathPoint): WarmStackPhase {
  const { calibratedTo, source } = waterPhases[stretch.phase];
  const tooHot = isFluid(stretch.phase) && end.temperature > fluidLimits.calibratedTemperature;
  return {
    name: stretch.name,
    form: "water",
    curve,
    fromPressure: curve.minPressure,
    untilPressure: curve.maxPressure,
    calibratedTo: tooHot ? curve.minPressure : calibratedTo,
    source,
  };
}

function requirePressures(fromPressure: number, toPressure: number): void {
  if (fromPressure >= 0 && toPressure > fromPressure && toPressure <= WATER_MAX_PRESSURE) return;
  throw new ModelRangeError(
    "water-pressure-range",
    `A water layer from ${fromPressure} to ${toPressure} Pa cannot be traced; give 0 <= from < to <= ${WATER_MAX_PRESSURE} Pa.`,
    { quantity: "pressure", value: toPressure, minimum: Math.max(0, fromPressure), maximum: WATER_MAX_PRESSURE },
  );
}

function requireBareIce(name: WaterPhaseName, temperature: number): void {
  if (name === "ice-Ih") return;
  throw new ModelRangeError(
    "water-bare-surface",
    `Water at ${temperature} K cannot have a surface at 0 Pa: it would boil. Give a surface pressure, or at most ` +
      `${triplePoints.solidLiquidGas.temperature} K.`,
    { quantity: "temperature", value: temperature, maximum: triplePoints.solidLiquidGas.temperature },
  );
}

function tooManyStretches(at: PathPoint): ConvergenceError {
  return new ConvergenceError(
    "water-barotrope",
    `The adiabat of water runs along a phase boundary at ${at.pressure} Pa and ${at.temperature} K; choose a slightly ` +
      "different surface temperature.",
    at,
  );
}
