import type { PublicationRule } from "../crosscheck/choosePublication.ts";
import type { ListOptions } from "./listOptions.ts";
import type { GlobalOptions, ResultOptions } from "./resultOptions.ts";
import type { RuleOptions } from "./ruleOptions.ts";

export interface CrosscheckOptions extends GlobalOptions, ResultOptions, ListOptions, RuleOptions {
  readonly choose?: PublicationRule;
  readonly aliases?: string;
  readonly library?: string;
  readonly html?: string;
}
