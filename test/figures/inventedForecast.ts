import type { PrecisionInput } from "../../src/figures/precisionSpec.ts";
import { inventedSurvey } from "./inventedSurvey.ts";

/** A forecast with round numbers: 10 % between the radii, 0.25 % of radius for 1 % of mass. */
export const inventedForecast: PrecisionInput = {
  title: "What tells fudge from toffee",
  labels: ["fudge", "toffee"],
  gap: 10,
  slope: 0.25,
  mass: { value: 5, minus: 0.5, plus: 0.5 },
  radius: { value: 1.6, minus: 0.05, plus: 0.05 },
  present: { massError: 10, radiusError: 3.125 },
  massErrors: [1, 2, 4, 8, 16, 32],
  radiusErrors: [0.5, 1, 2, 4, 8, 16],
  levels: [2, 3, 5],
  steps: {
    columns: [
      { title: "Errors" },
      { title: "Mass error", unit: "%" },
      { title: "Never filled" },
      { title: "In words" },
    ],
    rows: [
      ["today", 10, null, "fudge and toffee differ by 2.5 sigma"],
      ["halve the mass error", 5, null, "fudge and toffee differ by 3.0 sigma"],
    ],
  },
  caption: {
    warnings: [],
    notes: [],
    compositions: [],
    sources: inventedSurvey.sources,
    earthRadius: "1 Earth radius = 6378.1 km",
    version: inventedSurvey.version,
    command: inventedSurvey.command,
  },
};

const hostile = '<img src=x onerror="alert(1)">$x$ "quoted" & </script>';

export const hostileForecast: PrecisionInput = {
  ...inventedForecast,
  title: hostile,
  labels: [hostile, "toffee"],
  steps: { ...inventedForecast.steps, rows: [[hostile, 10, null, hostile]] },
};
