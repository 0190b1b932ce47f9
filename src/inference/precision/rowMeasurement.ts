import type { MassRange } from "../../curve/radiusCurve.ts";
import type { MeasuredQuantity, PlanetRow } from "../../planets/quantity.ts";
import { type Measurement, shareOutsideRange } from "../measurement.ts";
import { refusalReasons } from "../refusal.ts";
import type { SplitNormal } from "../splitNormal.ts";

/** A row's mass and radius as a measurement, or the codes of all reasons why they are none. */
export type RowMeasurement =
  | { readonly measurement: Measurement; readonly reasons?: undefined }
  | { readonly measurement?: undefined; readonly reasons: readonly string[] };

/** As the classifier: no forecast can be wrong by more than this share of what is known about the mass. */
const LARGEST_SHARE_OUTSIDE = 0.01;

/** Reads a row as `classify` does, so that both use and refuse the same planets. */
export function rowMeasurement(row: PlanetRow, range: MassRange): RowMeasurement {
  const reasons = refusalReasons(row);
  if (reasons.length > 0) return { reasons };
  const mass = splitNormal(row.quantities.mass);
  const isDescribed = mass.mode >= range.lightest && mass.mode <= range.heaviest;
  if (!isDescribed || shareOutsideRange(mass, range) > LARGEST_SHARE_OUTSIDE)
    return { reasons: ["mass-beyond-models"] };
  return { measurement: { mass, radius: splitNormal(row.quantities.radius) } };
}

/** For rows that passed `refusalReasons`. */
function splitNormal(quantity: MeasuredQuantity | undefined): SplitNormal {
  const { value, minus, plus } = quantity as Required<Pick<MeasuredQuantity, "value" | "minus" | "plus">>;
  return { mode: value, minus, plus };
}
