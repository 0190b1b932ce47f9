import { type Command, InvalidArgumentError, Option } from "commander";
import type { Severity } from "../crosscheck/finding.ts";
import type { Rule } from "../crosscheck/rule.ts";
import { rules } from "../crosscheck/rules.ts";
import { suggestion } from "../library/nearest.ts";
import { parseNames } from "./listOptions.ts";

/** Which rules a cross-check holds a list to, and which findings make it fail. */
export interface RuleOptions {
  readonly rules?: readonly string[];
  readonly ignore?: readonly string[];
  readonly failOn?: Exclude<Severity, "info">;
}

export function addRuleOptions(command: Command): Command {
  return command
    .option("--rules <rules>", "check these only, separated by commas", parseRules)
    .option("--ignore <rules>", "leave these out, separated by commas", parseRules)
    .addOption(
      new Option("--fail-on <severity>", "exit with 1 if there is a finding this grave").choices(["error", "warning"]),
    );
}

export function chosenRules({ rules: wanted, ignore = [] }: RuleOptions): Rule[] {
  return rules.filter(({ id }) => (wanted?.includes(id) ?? true) && !ignore.includes(id));
}

function parseRules(text: string): readonly string[] {
  const known = rules.map(({ id }) => id);
  const names = parseNames(text);
  const unknown = names.find((name) => !known.includes(name));
  if (unknown === undefined) return names;
  throw new InvalidArgumentError(
    `There is no rule "${unknown}".${suggestion(unknown, known)} Rules: ${known.join(", ")}.`,
  );
}
