import type { MeasuredQuantity, PlanetRow, QuantityName } from "../../planets/quantity.ts";
import type { Discrepancy } from "../finding.ts";
import { groupBy } from "../groupBy.ts";
import { nameKey } from "../planetName.ts";
import { times } from "../ratioInWords.ts";
import type { ListRule } from "../rule.ts";
import { hasBothErrors, SIGNIFICANT, tensionSigma } from "../significance.ts";
import { weightedMean } from "../weightedMean.ts";

const compared: readonly QuantityName[] = ["mass", "minimumMass", "radius", "period"];

/** Less than this is not worth a row's attention, however small the errors: periods differ by transit timing. */
const LEAST_DIFFERENCE = 0.1;

/** With two values one cannot say which is the outlier. */
const ENOUGH = 3;

function outliers(group: readonly PlanetRow[], name: QuantityName): Discrepancy[] {
  const members = group.flatMap((row) => {
    const quantity = row.quantities[name];
    return quantity?.kind === "measured" && hasBothErrors(quantity) ? [{ row, quantity }] : [];
  });
  if (members.length < ENOUGH) return [];
  return members.flatMap(({ row, quantity }) => {
    const others = members.filter((member) => member.row !== row).map((member) => member.quantity);
    return against(row, name, quantity, others);
  });
}

function against(
  row: PlanetRow,
  name: QuantityName,
  quantity: MeasuredQuantity,
  others: readonly MeasuredQuantity[],
): Discrepancy[] {
  const mean = weightedMean(others);
  if (!mean) return [];
  const sigma = Math.abs(
    tensionSigma(quantity, { ...quantity, value: mean.value, minus: mean.error, plus: mean.error }) ?? 0,
  );
  const logRatio = Math.log(quantity.value / mean.value);
  if (!(sigma >= SIGNIFICANT) || !(Math.abs(logRatio) > LEAST_DIFFERENCE)) return [];
  return [
    {
      row,
      quantity: name,
      value: quantity.value,
      expected: mean.value,
      significanceSigma: sigma,
      explanation: `${times(logRatio)} the mean of the planet's ${others.length} other publications`,
      remedy: "prefer another publication, or find out why this one differs",
    },
  ];
}

function test(rows: readonly PlanetRow[]): readonly Discrepancy[] {
  const groups = groupBy(rows, (row) => nameKey(row.name));
  return [...groups].flatMap(([key, group]) =>
    key === "" || group.length < ENOUGH ? [] : compared.flatMap((name) => outliers(group, name)),
  );
}

export const outlyingPublication: ListRule = {
  id: "outlying-publication",
  scope: "list",
  severity: "warning",
  claim: "The publications of one planet agree",
  formula: "|x − mean of the others| < 4 σ or < 10 %, the mean's error enlarged by √(χ²/(n − 1))",
  source: "scale factor of the Particle Data Group, Review of Particle Physics",
  test,
};
