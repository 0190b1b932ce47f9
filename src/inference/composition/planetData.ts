import type { MeasuredQuantity, PlanetRow } from "../../planets/quantity.ts";
import { isErrorSize, refusalReasons } from "../refusal.ts";
import { combinedLikelihood, type Datum, type MassDatum } from "./combinedLikelihood.ts";
import type { PlanetLikelihood } from "./likelihood.ts";
import { measuredLikelihood } from "./measuredLikelihood.ts";

/** What a row says of a planet's mass and radius, or the codes of why that is not enough. */
export type RowLikelihood =
  | { readonly likelihood: PlanetLikelihood; readonly reasons?: undefined }
  | { readonly likelihood?: undefined; readonly reasons: readonly string[] };

/**
 * The likelihood of a row: mass and radius as measured, or where one is not, what else is known of it: an upper or lower
 * limit, a minimum mass (of isotropic inclination), or the bulk density. At least one number must be measured.
 * `correlation` of the errors of mass and radius counts where both are measured.
 */
export function rowLikelihood(row: PlanetRow, correlation = 0): RowLikelihood {
  const { mass, minimumMass, radius, density } = row.quantities;
  const massDatum = datumOf(mass) ?? minimumOf(minimumMass ?? mass);
  const radiusDatum = datumOf(radius);
  // A density that the list or Bulkwright made of mass and radius says nothing new beside them.
  const densityDatum = massDatum === undefined || radiusDatum === undefined ? datumOf(density) : undefined;
  const data = [massDatum, radiusDatum, densityDatum].filter((datum) => datum !== undefined);
  const isKnown = data.length >= 2 && data.some(({ kind }) => kind === "measured" || kind === "minimum");
  if (!isKnown) return { reasons: refusalReasons(row) };
  if (massDatum?.kind === "measured" && radiusDatum?.kind === "measured") {
    return { likelihood: measuredLikelihood({ mass: massDatum.value, radius: radiusDatum.value, correlation }) };
  }
  return { likelihood: combinedLikelihood({ mass: massDatum, radius: radiusDatum, density: densityDatum }) };
}

function datumOf(quantity: MeasuredQuantity | undefined): Datum | undefined {
  if (quantity === undefined || !(quantity.value > 0)) return undefined;
  const { kind, value, minus, plus } = quantity;
  if (kind === "upper-limit" || kind === "lower-limit") return { kind, limit: value };
  return kind === "measured" && isErrorSize(minus) && isErrorSize(plus)
    ? { kind, value: { mode: value, minus, plus } }
    : undefined;
}

function minimumOf(quantity: MeasuredQuantity | undefined): MassDatum | undefined {
  if (quantity === undefined || !(quantity.value > 0)) return undefined;
  const { kind, value, minus, plus } = quantity;
  const isMinimum = kind === "minimum" || kind === "measured";
  return isMinimum && isErrorSize(minus) && isErrorSize(plus)
    ? { kind: "minimum", value: { mode: value, minus, plus } }
    : undefined;
}
