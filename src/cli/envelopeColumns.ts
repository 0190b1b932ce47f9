import { radiusAtPressure } from "../envelope/transit.ts";
import { EARTH_FLUX, GIGAYEAR } from "../units/constants.ts";
import type { ColumnGroup } from "./columnGroup.ts";
import type { Cell } from "./csv.ts";

const columns = [
  "envelope_mass_fraction",
  "flux_earth",
  "age_gyr",
  "core_radius_earth",
  "radius_earth_convective",
  "escape_parameter",
  "mass_loss_time_gyr",
];

/** What a gas envelope adds to a curve; empty for planets without one. */
export function envelopeColumns(earthRadius: number): ColumnGroup {
  return {
    columns,
    cells: ({ envelope }) => {
      if (envelope === undefined) return Array<Cell>(columns.length).fill(undefined);
      const { massFraction, conditions, core, convectiveRadius, escapeParameter, massLossTime } = envelope;
      return [
        massFraction,
        conditions.flux / EARTH_FLUX,
        conditions.age / GIGAYEAR,
        core.radius / earthRadius,
        convectiveRadius / earthRadius,
        escapeParameter,
        massLossTime / GIGAYEAR,
      ];
    },
  };
}

/** The radius at which the atmosphere of an envelope has a stated pressure [Pa]. */
export function transitColumn(earthRadius: number, pressure: number): ColumnGroup {
  return {
    columns: ["radius_earth_at_transit_pressure"],
    cells: ({ mass, radius, envelope }) => [
      envelope && radiusAtPressure({ mass, radius }, envelope.temperature, pressure) / earthRadius,
    ],
  };
}
