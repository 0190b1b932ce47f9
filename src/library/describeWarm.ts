import type { Source } from "../eos/material.ts";
import { type MantleComposition, mantleMineralogy } from "../mineralogy/mantleMineralogy.ts";
import type { PhaseEntry } from "./schemas.ts";

/** Keys and their values, as in a material file. */
export type Parameters = Readonly<Record<string, number | string | boolean>>;

export interface MineralDescription {
  readonly name: string;
  readonly massFraction: number;
  readonly source: Source;
}

/** What makes a phase warm, by the name of the key that holds it: a group of keys within a group is one of its own. */
export function warmKeys({ thermal, alloy, untilFreezing, clapeyron }: PhaseEntry): Record<string, Parameters> {
  return groups({ thermal, alloy, untilFreezing, clapeyron });
}

function groups(keyed: Readonly<Record<string, object | undefined>>): Record<string, Parameters> {
  const found: Record<string, Parameters> = {};
  for (const [name, keys] of Object.entries(keyed)) {
    if (keys === undefined) continue;
    const entries = Object.entries(keys).filter(([, value]) => value !== undefined);
    const isGroup = ([, value]: [string, unknown]): boolean => typeof value === "object";
    found[name] = Object.fromEntries(entries.filter((entry) => !isGroup(entry)));
    Object.assign(found, groups(Object.fromEntries(entries.filter(isGroup))));
  }
  return found;
}

/** The end members of each phase of a mantle, from shallow to deep. */
export function mineralsByPhase(mantle: MantleComposition): MineralDescription[][] {
  return mantleMineralogy(mantle).map(({ minerals }) =>
    minerals.map(({ endMember: { name, source }, massFraction }) => ({ name, massFraction, source })),
  );
}
