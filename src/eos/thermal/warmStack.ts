import type { Phase, Source } from "../material.ts";
import { firstPositive } from "./firstPositive.ts";
import type { ThermalEos } from "./thermalState.ts";
import type { WarmCurve } from "./warmCurve.ts";

/** A phase with temperature, before it is known which stretch of pressure it fills. */
export interface WarmPhase {
  readonly name: string;
  readonly form: string;
  readonly eos: ThermalEos;
  /**
   * Pressure [Pa] at or above which it is stable rather than the phases before it, at a temperature [K]; such as
   * `boundaryPressure` or `meltingPressure` give. Not called for the first phase.
   */
  readonly stableFrom: (temperature: number) => number;
  readonly calibratedTo: number;
  readonly source: Source;
}

/** A phase of a stack whose curve knows its temperature. */
export interface WarmStackPhase extends Phase {
  readonly curve: WarmCurve;
}

/** How temperature goes on from an anchor: `isentrope`, or an isotherm or a table in the same clothes. */
export type TemperaturePath = (eos: ThermalEos, anchorPressure: number, anchorTemperature: number) => WarmCurve;

/**
 * The phases a layer runs through from its top downwards. At every pressure the last phase whose boundary has been
 * passed is the stable one, so a phase that a hot path never enters is left out. Temperature is continuous across
 * boundaries: the latent heat (some tens of kelvin for the mantle's transitions) is neglected.
 * Units   Pa, K, at the top of the layer
 * Checked test/eos/thermal/warmStack.test.ts
 */
export function warmStack(
  phases: readonly WarmPhase[],
  path: TemperaturePath,
  topPressure: number,
  topTemperature: number,
): WarmStackPhase[] {
  const stack: WarmStackPhase[] = [];
  let pressure = topPressure;
  let temperature = topTemperature;
  let index = phases.findLastIndex((phase, i) => i === 0 || pressure >= phase.stableFrom(temperature));
  for (;;) {
    const { name, form, eos, calibratedTo, source } = phases[index];
    const curve = path(eos, pressure, temperature);
    const next = firstCrossing(phases, index, curve, pressure);
    stack.push({
      name,
      form,
      curve,
      // The top phase also serves the lower pressures that a trial integration may touch.
      fromPressure: stack.length === 0 ? curve.minPressure : pressure,
      untilPressure: next?.pressure ?? Number.POSITIVE_INFINITY,
      calibratedTo,
      source,
    });
    if (next === undefined) return stack;
    temperature = curve.temperature(curve.coordinate(next.pressure));
    pressure = next.pressure;
    index = next.index;
  }
}

/** Where a later phase first becomes stable along `curve` beyond `from`, and the last phase that is stable there. */
function firstCrossing(
  phases: readonly WarmPhase[],
  index: number,
  curve: WarmCurve,
  from: number,
): { pressure: number; index: number } | undefined {
  const temperatureAt = (pressure: number): number => curve.temperature(curve.coordinate(pressure));
  let first: { pressure: number; index: number } | undefined;
  for (let j = index + 1; j < phases.length; j++) {
    const excess = (pressure: number): number => pressure - phases[j].stableFrom(temperatureAt(pressure));
    // A phase not yet stable where an earlier one is comes later; looking for it would follow the curve too far.
    if (first !== undefined && excess(first.pressure) < 0) continue;
    const guess = phases[j].stableFrom(temperatureAt(from));
    const pressure = firstPositive(excess, from, Math.max(guess, from), first?.pressure ?? curve.maxPressure);
    if (pressure !== undefined) first = { pressure, index: j };
  }
  return first;
}
