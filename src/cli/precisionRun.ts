import type { Improved } from "../inference/precision/improvementSteps.ts";
import type { PairLabels } from "../inference/precision/statement.ts";
import type { Composition } from "../library/composition.ts";
import type { Library } from "../library/library.ts";
import type { CommandContext } from "./commandContext.ts";
import type { FamilyName, FractionFamily } from "./fractionFamilies.ts";
import type { ListOptions } from "./listOptions.ts";
import type { OnePlanet } from "./onePlanet.ts";
import type { GlobalOptions, ResultOptions } from "./resultOptions.ts";

/** Which errors of a list's planets are halved, each in turn. */
export type Halving = Improved | "either";

export interface PrecisionOptions extends GlobalOptions, ResultOptions, ListOptions, OnePlanet {
  readonly keep?: readonly string[];
  readonly between: PairLabels;
  readonly sigma: readonly number[];
  readonly family: FamilyName;
  readonly library?: string;
  readonly halve?: Halving;
  readonly proportion?: number;
  readonly massErrorsPercent?: readonly number[];
  readonly radiusErrorsPercent?: readonly number[];
  readonly html?: string;
}

/** What a run of `precision` works with, of a list as of one planet. */
export interface PrecisionRun {
  readonly options: PrecisionOptions;
  readonly context: CommandContext;
  readonly library: Library;
  readonly pair: readonly [Composition, Composition];
  readonly family: FractionFamily;
}

/** All compositions of a run, each once, for its sources. */
export function usedCompositions({ pair, family }: PrecisionRun): Composition[] {
  return [...new Set([...pair, ...family.parts])];
}
