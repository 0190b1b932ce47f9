import type { MeasuredQuantity, QuantityName } from "../planets/quantity.ts";
import type { MatchedPair } from "./listMatch.ts";

/** One quantity that both rows of a pair hold. */
export interface QuantityTension {
  readonly pair: MatchedPair;
  readonly quantity: QuantityName;
  readonly value: MeasuredQuantity;
  readonly other: MeasuredQuantity;
  /** Signed; undefined unless both are measurements with errors on the sides that face each other. */
  readonly tensionSigma?: number;
  /** One measurement quoted twice is no test of its error. */
  readonly identical: boolean;
}
