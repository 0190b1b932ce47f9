import type { Severity } from "../../../src/crosscheck/finding.ts";
import type { PlanetRow } from "../../../src/planets/quantity.ts";

/** Lists on which a rule must fire and must be silent; the first row of each is the one looked at. */
export interface RuleCase {
  readonly rule: string;
  readonly fires: readonly { readonly why: string; readonly rows: readonly PlanetRow[]; readonly severity: Severity }[];
  readonly silent: readonly { readonly why: string; readonly rows: readonly PlanetRow[] }[];
}
