import type { Material, Source } from "../eos/material.ts";
import type { Composition } from "./composition.ts";

/** A source and what was taken from it. */
export interface UsedSource extends Source {
  /** `material, phase (form)`, or the name of a composition whose mass fractions it gives. */
  readonly subject: string;
}

/** Where everything in these compositions comes from, each source once per subject, in the order of use. */
export function sourcesOf(compositions: readonly Composition[]): UsedSource[] {
  const used = compositions.flatMap(({ name, source, layers, envelope }) => [
    ...(source ? [{ subject: name, ...source }] : []),
    ...layers.flatMap(({ material }) => materialSources(material)),
    ...(envelope ? envelopeSources.map((source) => ({ subject: `${name}, gas envelope`, ...source })) : []),
  ]);
  return [...new Map(used.map((source) => [JSON.stringify(source), source])).values()];
}

/** What the radius of a planet with gas, and the notes on its survival, rest on. */
const envelopeSources: readonly Source[] = [
  {
    citation: "Lopez & Fortney 2014, Astrophys. J. 792, 1, equation 4",
    doi: "10.1088/0004-637X/792/1/1",
    note: "age exponent for solar opacity, and 9 scale heights of radiative atmosphere, from memory",
  },
  {
    citation: "Owen & Wu 2017, Astrophys. J. 847, 29, equations 22-24",
    doi: "10.3847/1538-4357/aa890a",
    note: "high-energy light of a sun-like star, for the time of mass loss; from memory, efficiency 0.1",
  },
];

function materialSources({ name, source, phases, everyPhase = phases }: Material): UsedSource[] {
  return [
    ...(source ? [{ subject: name, ...source }] : []),
    ...everyPhase.flatMap((phase) => phaseSources(name, phase)),
  ];
}

function phaseSources(material: string, phase: NonNullable<Material["everyPhase"]>[number]): UsedSource[] {
  if (phase.components) return phase.components.flatMap((part) => phaseSources(part.material, part.phase));
  return [{ subject: `${material}, ${phase.name} (${phase.form})`, ...phase.source }];
}
