import type { Measurement } from "../inference/measurement.ts";
import type { StepForecast } from "../inference/precision/planetForecast.ts";
import { type PairLabels, stepStatement } from "../inference/precision/statement.ts";
import type { Cell } from "./csv.ts";
import type { Table } from "./table.ts";

/** How a row is called: `now`, `halve-mass`, `mass-alone`, `both`. */
export function stepCode({ kind, improved }: StepForecast): string {
  if (kind === "now") return "now";
  if (kind === "halved") return `halve-${improved}`;
  return improved === "both" ? "both" : `${improved}-alone`;
}

/** What errors are needed and what they buy, one row a step. `fraction` is the column name of the family's fraction. */
export function stepTable(
  steps: readonly StepForecast[],
  present: Measurement,
  labels: PairLabels,
  fraction: string,
): Table {
  const now = steps[0].separation ?? 0;
  return {
    columns: [
      "step",
      "wanted_sigma",
      "mass_error_percent",
      "radius_error_percent",
      "separation_sigma",
      "separation_sigma_nonlinear",
      "limiting_error",
      "mass_share_of_variance",
      "log10_bayes_factor_if_first",
      "log10_bayes_factor_if_second",
      `${fraction}_width68`,
      "information_bit",
      "statement",
    ],
    rows: steps.map((step) => [...stepCells(step, present), stepStatement(step, now, labels)]),
  };
}

function stepCells(step: StepForecast, { mass, radius }: Measurement): Cell[] {
  const { level, errors, separation, evidence, limiting, massShare, learning } = step;
  return [
    stepCode(step),
    level,
    percent(errors?.mass, mass.mode),
    percent(errors?.radius, radius.mode),
    separation,
    evidence?.separation,
    limiting,
    massShare,
    log10(evidence?.ifA),
    log10(evidence?.ifB),
    learning?.width68,
    learning?.informationBits,
  ];
}

/** Blank for what is not measured. */
export function percent(error: number | undefined, value: number): number | undefined {
  return error === undefined || error === Number.POSITIVE_INFINITY ? undefined : (100 * error) / value;
}

function log10(naturalLogarithm: number | undefined): number | undefined {
  return naturalLogarithm === undefined ? undefined : naturalLogarithm / Math.LN10;
}
