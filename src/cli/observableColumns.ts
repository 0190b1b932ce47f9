import { synchronousFigure } from "../interior/distortion.ts";
import { coreRadiusFraction, escapeSpeed, planetLoveNumber } from "../interior/observables.ts";
import type { ColumnGroup } from "./columnGroup.ts";

/** What else can be observed, or follows from the inside. */
export const observableColumns: ColumnGroup = {
  columns: ["fluid_love_number", "core_radius_fraction", "escape_speed_m_s", "binding_energy_j"],
  cells: (planet) => [planetLoveNumber(planet), coreRadiusFraction(planet), escapeSpeed(planet), planet.bindingEnergy],
};

/** What a transit shows of a planet that turns with its orbit of this period [s]: `radius_earth` is the volumetric one. */
export function distortionColumns(earthRadius: number, period: number): ColumnGroup {
  return {
    columns: ["radius_earth_distorted_transit", "radius_earth_substellar"],
    cells: (planet) => {
      const loveNumber = planetLoveNumber(planet);
      if (loveNumber === undefined) return [undefined, undefined];
      const { transitRadius, substellar } = synchronousFigure(planet, loveNumber, period);
      return [transitRadius / earthRadius, substellar / earthRadius];
    },
  };
}
