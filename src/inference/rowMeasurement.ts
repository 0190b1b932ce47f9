import type { MassRange } from "../curve/radiusCurve.ts";
import type { MeasuredQuantity, PlanetRow } from "../planets/quantity.ts";
import { type Measurement, shareOutsideRange } from "./measurement.ts";
import { refusalReasons } from "./refusal.ts";
import type { SplitNormal } from "./splitNormal.ts";

/** A row's mass and radius as a measurement, or the codes of all reasons why they are none. */
export type RowMeasurement =
  | { readonly measurement: Measurement; readonly reasons?: undefined }
  | { readonly measurement?: undefined; readonly reasons: readonly string[] };

/**
 * Largest share of what is known about a mass that may lie outside the models: no probability can be wrong by more.
 * It is there so that a small planet with a large error, whose mass likelihood runs down to 0, still gets its verdict.
 */
const LARGEST_SHARE_OUTSIDE = 0.01;

/**
 * Reads a row for every use of a measured planet, so that all use and refuse the same ones.
 * Checked test/inference/classifier.test.ts, refusal.test.ts
 */
export function rowMeasurement(row: PlanetRow, range: MassRange): RowMeasurement {
  const reasons = refusalReasons(row);
  if (reasons.length > 0) return { reasons };
  const measurement = { mass: splitNormal(row.quantities.mass), radius: splitNormal(row.quantities.radius) };
  return isWithin(range, measurement.mass) ? { measurement } : { reasons: ["mass-beyond-models"] };
}

/** For rows that passed `refusalReasons`. */
function splitNormal(quantity: MeasuredQuantity | undefined): SplitNormal {
  const { value, minus, plus } = quantity as Required<Pick<MeasuredQuantity, "value" | "minus" | "plus">>;
  return { mode: value, minus, plus };
}

function isWithin(range: MassRange, mass: SplitNormal): boolean {
  if (!(mass.mode >= range.lightest && mass.mode <= range.heaviest)) return false;
  return shareOutsideRange(mass, range) <= LARGEST_SHARE_OUTSIDE;
}
