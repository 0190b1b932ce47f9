import type { ListComparison } from "../crosscheck/compareLists.ts";
import { displayName } from "../crosscheck/displayUnits.ts";
import { groupBy } from "../crosscheck/groupBy.ts";
import type { ListMatch } from "../crosscheck/listMatch.ts";
import { textTable } from "./textTable.ts";

/** How many rows of two lists are the same planets, in a sentence. */
export function matchSummary(list: string, other: string, match: ListMatch): string {
  const { pairs, ambiguous, unmatched, unmatchedOther } = match;
  const methods = [...groupBy(pairs, ({ method }) => method)].map(([method, found]) => `${found.length} by ${method}`);
  return [
    `${pairs.length} pairs${methods.length > 0 ? ` (${methods.join(", ")})` : ""}`,
    `${ambiguous.length} ambiguous`,
    `${unmatched.length} only in ${list}`,
    `${unmatchedOther.length} only in ${other}`,
  ].join(", ");
}

/** Two lists compared, for a person to read. */
export function comparisonSummary(
  list: string,
  { other, match, comparison }: { other: string; match: ListMatch; comparison: ListComparison },
): string {
  const { pulls, verdicts } = comparison;
  const both = verdicts.filter(({ verdict, verdictOther }) => verdict !== undefined && verdictOther !== undefined);
  const moved = both.filter((change) => change.moved).length;
  return [
    `${list} against ${other}: ${matchSummary(list, other, match)}\n`,
    ...(pulls.length > 0 ? [pullTable(comparison)] : []),
    `${moved} of ${both.length} planets with a verdict in both lists change it\n`,
  ].join("");
}

function pullTable({ pulls }: ListComparison): string {
  return textTable(
    ["quantity", "pairs", "identical", "mean pull", "chi-square", "off by sigma", "% beyond 3 sigma"],
    pulls.map((pull) => [
      displayName(pull.quantity),
      pull.count,
      pull.identical,
      rounded(pull.mean),
      rounded(pull.chiSquare),
      rounded(pull.chiSquareSigma),
      rounded(100 * pull.fractionBeyond3Sigma),
    ]),
  );
}

const rounded = (value: number) => Number(value.toPrecision(3));
