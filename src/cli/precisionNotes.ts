import type { Measurement } from "../inference/measurement.ts";
import type { StepForecast } from "../inference/precision/planetForecast.ts";
import { errorSizes, isMeasured } from "../inference/precision/plannedMeasurement.ts";
import { type CurvePair, contrastAt, separation } from "../inference/precision/separation.ts";
import { DEGENERATE_BELOW, type PairLabels, stepStatement } from "../inference/precision/statement.ts";
import type { FractionFamily } from "./fractionFamilies.ts";

/** Where the linear formula is off by more than this, the output says so. */
const tolerated = 0.1;

/** What the columns of every precision table rest on. */
export function methodNotes([a, b]: PairLabels, { title }: FractionFamily): string[] {
  return [
    `separation_sigma = |R_A(M) - R_B(M)| / sqrt(radius_error^2 + (dR/dM mass_error)^2) at the measured mass, A = ${a}, B = ${b}, dR/dM the mean of both curves`,
    `width68: expected width of the 68 % interval of the ${title}, averaged over the values that may be measured; flat priors on fraction and mass`,
  ];
}

/** What must be known before a number of one planet's forecast is used. */
export function planetWarnings(present: Measurement, steps: readonly StepForecast[], labels: PairLabels): string[] {
  const supposed = (["mass", "radius"] as const).filter((quantity) => !isMeasured(present[quantity]));
  const [now] = steps;
  const isDegenerate = supposed.length === 0 && (now.separation ?? 0) < DEGENERATE_BELOW;
  return [
    ...supposed.map((quantity) => `the ${quantity} is not given: that of ${labels[0]} is used, without an error`),
    ...(isDegenerate ? [stepStatement(now, 0, labels)] : []),
    ...(steps.some(isNonlinear)
      ? [
          "separation_sigma, and a map of it, is off by more than 10 % in places, as the curves bend within the mass error or differ in slope; go by separation_sigma_nonlinear there",
        ]
      : []),
  ];
}

/** How well the radius measured today fits each of the two compositions. */
export function placeNotes(present: Measurement, pair: CurvePair, [a, b]: PairLabels): string[] {
  if (!isMeasured(present.mass) || !isMeasured(present.radius)) return [];
  const mass = present.mass.mode;
  const { slope } = contrastAt(pair, mass);
  const distance = (expected: number) =>
    separation({ gap: Math.abs(present.radius.mode - expected), slope }, errorSizes(present)).toFixed(1);
  return [
    `the measured radius is ${distance(pair.a.radius(mass))} sigma from ${a} and ${distance(pair.b.radius(mass))} sigma from ${b}`,
  ];
}

function isNonlinear({ separation, evidence }: StepForecast): boolean {
  if (separation === undefined || evidence === undefined) return false;
  return Math.abs(evidence.separation / separation - 1) > tolerated;
}
