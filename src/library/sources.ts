import type { Material, Source } from "../eos/material.ts";
import type { Composition } from "./composition.ts";

/** A source and what was taken from it. */
export interface UsedSource extends Source {
  /** `material, phase (form)`, or the name of a composition whose mass fractions it gives. */
  readonly subject: string;
}

/** Where everything in these compositions comes from, each source once per subject, in the order of use. */
export function sourcesOf(compositions: readonly Composition[]): UsedSource[] {
  const used = compositions.flatMap(({ name, source, layers }) => [
    ...(source ? [{ subject: name, ...source }] : []),
    ...layers.flatMap(({ material }) => materialSources(material)),
  ]);
  return [...new Map(used.map((source) => [JSON.stringify(source), source])).values()];
}

function materialSources({ name, source, phases, everyPhase = phases }: Material): UsedSource[] {
  const own = source ? [{ subject: name, ...source }] : [];
  return [...own, ...everyPhase.flatMap((phase) => phaseSources(name, phase))];
}

function phaseSources(material: string, phase: NonNullable<Material["everyPhase"]>[number]): UsedSource[] {
  if (phase.components) return phase.components.flatMap((part) => phaseSources(part.material, part.phase));
  return [{ subject: `${material}, ${phase.name} (${phase.form})`, ...phase.source }];
}
