import type { Improved } from "../inference/precision/improvementSteps.ts";
import { errorSizes } from "../inference/precision/plannedMeasurement.ts";
import { expectedReduction, type PlanetWorth, type RankablePlanet } from "../inference/precision/rankPlanets.ts";
import { requiredMassError, requiredRadiusError } from "../inference/precision/requiredErrors.ts";
import { limitingError, separation } from "../inference/precision/separation.ts";
import { type PairLabels, separationStatement } from "../inference/precision/statement.ts";
import { EARTH_MASS } from "../units/constants.ts";
import type { Cell } from "./csv.ts";
import type { KeptColumn } from "./keptColumns.ts";
import { percent } from "./stepTable.ts";
import type { Table } from "./table.ts";

/** What a list of planets is ranked for. */
export interface WorthPlan {
  readonly labels: PairLabels;
  readonly levels: readonly number[];
  readonly choices: readonly Improved[];
  /** Column name of the family's fraction. */
  readonly fraction: string;
  readonly earthRadius: number;
}

export function worthColumns({ levels, choices, fraction }: WorthPlan): string[] {
  return [
    "rank",
    "name",
    "reasons",
    "mass_earth",
    "radius_earth",
    "mass_error_percent",
    "radius_error_percent",
    `${fraction}_width68`,
    "halve",
    `${fraction}_width68_reduction`,
    "information_bit",
    ...choices.map((improved) => `${fraction}_width68_halve_${improved}`),
    "separation_sigma",
    "limiting_error",
    ...levels.flatMap((level) => [`mass_error_percent_for_${level}_sigma`, `radius_error_percent_for_${level}_sigma`]),
    "statement",
  ];
}

/** One row a planet, in the order given, which is that of their rank. */
export function worthTable(planets: readonly PlanetWorth[], plan: WorthPlan, kept: readonly KeptColumn[]): Table {
  const columns = worthColumns(plan);
  return {
    columns: [...columns, ...kept.map(({ name }) => name)],
    rows: planets.map((planet, i) => {
      const { row, reasons } = planet;
      const cells = [row.name, reasons?.join(";"), ...quantityCells(planet, plan.earthRadius)];
      const forecast =
        reasons === undefined ? worthCells(planet, plan) : Array<Cell>(columns.length - 5).fill(undefined);
      const rank = reasons === undefined ? String(i + 1) : undefined;
      return [rank, ...cells, ...forecast, ...kept.map(({ index }) => row.cells[index])];
    }),
  };
}

function quantityCells({ row }: PlanetWorth, earthRadius: number): Cell[] {
  const { mass, radius } = row.quantities;
  return [mass && mass.value / EARTH_MASS, radius && radius.value / earthRadius];
}

/** From the mass error on. */
function worthCells(planet: RankablePlanet, { labels, levels }: WorthPlan): Cell[] {
  const { measurement, contrast, width68, halved, best } = planet;
  const [mass, radius] = [measurement.mass.mode, measurement.radius.mode];
  const errors = errorSizes(measurement);
  const sigma = separation(contrast, errors);
  const limiting = limitingError(contrast, errors);
  return [
    percent(errors.mass, mass),
    percent(errors.radius, radius),
    width68,
    best.improved,
    expectedReduction(planet),
    best.learning.informationBits,
    ...halved.map(({ learning }) => learning.width68),
    sigma,
    limiting,
    ...levels.flatMap((level) => [
      percent(requiredMassError(contrast, level, errors.radius), mass),
      percent(requiredRadiusError(contrast, level, errors.mass), radius),
    ]),
    separationStatement(sigma, limiting, labels),
  ];
}
