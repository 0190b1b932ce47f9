import type { FamilyModel } from "../inference/composition/compositionPosterior.ts";
import type { FractionSummary } from "../inference/composition/distribution.ts";
import type { Cell } from "./csv.ts";
import type { FamilyResult } from "./familyInference.ts";

/** Columns of the families of a run: of every component that one of them has, then of the family itself. */
export function familyColumns(families: readonly FamilyModel[]): string[] {
  const fractions = componentNames(families).flatMap((name) => {
    const column = `${columnName(name)}_fraction`;
    return [column, ...["lower68", "upper68", "lower95", "upper95", "mean"].map((what) => `${column}_${what}`)];
  });
  return [...fractions, "family", "log_evidence", "predictive_p"];
}

/** A planet's cells, of the family that it belongs to most probably. */
export function familyCells(families: readonly FamilyModel[], results: readonly FamilyResult[]): Cell[] {
  const best = mostProbable(results);
  const summaries = new Map(best?.family.components.map((name, k) => [name, best.posterior.fractions[k]]));
  return [
    ...componentNames(families).flatMap((name) => summaryCells(summaries.get(name))),
    best?.family.name,
    best?.posterior.logEvidence,
    best?.posterior.predictiveP,
  ];
}

/** All families of a planet, for JSON. */
export function familyDetails(results: readonly FamilyResult[]): object[] {
  const best = mostProbable(results);
  return results.map(({ family, posterior, reasons }) =>
    posterior === undefined || best === undefined
      ? { family: family.name, reasons }
      : {
          family: family.name,
          log_evidence: posterior.logEvidence,
          log_bayes_factor_to_best: posterior.logEvidence - best.posterior.logEvidence,
          predictive_p: posterior.predictiveP,
          fractions: Object.fromEntries(
            family.components.map((name, k) => [name, jsonSummary(posterior.fractions[k])]),
          ),
        },
  );
}

type Inferred = Extract<FamilyResult, { reasons?: undefined }>;

function mostProbable(results: readonly FamilyResult[]): Inferred | undefined {
  const inferred = results.filter((result): result is Inferred => result.posterior !== undefined);
  return inferred.reduce<Inferred | undefined>(
    (best, result) => (best && best.posterior.logEvidence >= result.posterior.logEvidence ? best : result),
    undefined,
  );
}

function componentNames(families: readonly FamilyModel[]): string[] {
  return [...new Set(families.flatMap(({ components }) => components))];
}

function columnName(name: string): string {
  return name.replaceAll("-", "_");
}

function summaryCells(summary: FractionSummary | undefined): Cell[] {
  if (summary === undefined) return Array<Cell>(6).fill(undefined);
  const { median, mean, within68, within95 } = summary;
  return [median, within68.lower, within68.upper, within95.lower, within95.upper, mean];
}

function jsonSummary({ median, mean, within68, within95 }: FractionSummary): object {
  return {
    median,
    mean,
    lower68: within68.lower,
    upper68: within68.upper,
    lower95: within95.lower,
    upper95: within95.upper,
  };
}
