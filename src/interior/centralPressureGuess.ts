import { type Material, phaseAt } from "../eos/material.ts";
import type { Composition } from "../library/composition.ts";
import { G } from "../units/constants.ts";

/** Enough for a guess within a factor of a few; the shooting needs no better. */
const ROUNDS = 8;

/**
 * First guess of the central pressure [Pa]: a uniform sphere, P = (π/6)^(1/3) G M^(2/3) ρ^(4/3) (from
 * P = 3GM²/8πR⁴, Chandrasekhar 1939, ch. III), whose density is the layers' mean at half that pressure.
 */
export function guessCentralPressure(composition: Composition, mass: number): number {
  const scale = (Math.PI / 6) ** (1 / 3) * G * mass ** (2 / 3);
  const surface = composition.surface.pressurePa;
  let pressure = surface;
  for (let i = 0; i < ROUNDS; i++) {
    const next = surface + scale * meanDensity(composition, pressure / 2) ** (4 / 3);
    // Halfway in the logarithm: the plain iteration runs away for soft forms (ρ growing faster than P^(3/4)).
    pressure = pressure === 0 ? next : Math.sqrt(pressure * next);
  }
  return pressure;
}

function meanDensity(composition: Composition, pressure: number): number {
  let volume = 0;
  for (const { material, massFraction } of composition.layers) volume += massFraction / densityNear(material, pressure);
  return 1 / volume;
}

/** Density at a pressure moved into the phase's range; any number will do where the form ends. */
function densityNear(material: Material, pressure: number): number {
  const { curve } = phaseAt(material, pressure);
  const inRange = Math.min(Math.max(pressure, curve.minPressure), curve.maxPressure * 0.99);
  return Math.max(curve.density(curve.coordinate(inRange)), 1);
}
