import type { PlanetRow } from "../../planets/quantity.ts";
import type { Discrepancy, Severity } from "../finding.ts";
import { isSet } from "../flag.ts";
import type { RowRule } from "../rule.ts";

/** Gravest first; the first that matches counts. */
const states: readonly (readonly [pattern: RegExp, severity: Severity, words: string])[] = [
  [/retract|refut|false|reject/i, "error", "withdrawn: there is no such planet"],
  [/controvers|disput|doubt/i, "warning", "disputed in the literature"],
  [/candidate|unconfirm|unverif|tentative/i, "info", "not confirmed"],
];

function test(row: PlanetRow): readonly Discrepancy[] {
  const flag = isSet(row.texts.controversial) ? "controversial" : "";
  const text = [row.texts.status?.trim(), flag].filter(Boolean).join(", ");
  const state = states.find(([pattern]) => pattern.test(text));
  if (!state) return [];
  const [, severity, words] = state;
  return [
    {
      row,
      quantity: "status",
      value: text,
      explanation: words,
      remedy: severity === "info" ? "keep it apart from confirmed planets" : "leave it out",
      severity,
    },
  ];
}

export const status: RowRule = {
  id: "status",
  scope: "row",
  severity: "warning",
  claim: "The row is a confirmed planet: candidates are an info, disputed ones a warning, withdrawn ones an error",
  formula: "status says nothing to the contrary",
  source: "the list's own status",
  test,
};
