import { type Material, type Phase, phaseAt } from "./material.ts";
import { mixCurves } from "./mixCurves.ts";

export interface MaterialPart {
  readonly material: Material;
  /** Share of the mass, > 0; the shares sum to 1. */
  readonly massFraction: number;
}

/**
 * Whole materials mixed so intimately that they share one pressure and their volumes add. A phase boundary of any part
 * is one of the mixture. Named by its parts, joined by `+`.
 * Checked test/eos/mixMaterials.test.ts
 */
export function mixMaterials(parts: readonly MaterialPart[]): Material {
  if (parts.length === 1) return parts[0].material;
  const materials = parts.map((part) => part.material);
  const lowest = Math.max(...materials.map(({ phases }) => phases[0].fromPressure));
  const boundaries = materials.flatMap(({ phases }) => phases.map((phase) => phase.fromPressure));
  const starts = [...new Set([lowest, ...boundaries])].filter((p) => p >= lowest).sort((a, b) => a - b);
  return {
    name: materials.map(({ name }) => name).join("+"),
    title: parts.map(({ material, massFraction }) => `${percent(massFraction)} ${material.title}`).join(" + "),
    phases: starts.map((from, i) => mixPhases(parts, from, starts[i + 1] ?? Number.POSITIVE_INFINITY)),
  };
}

const percent = (fraction: number): string => `${Number((100 * fraction).toPrecision(6))} %`;

function mixPhases(parts: readonly MaterialPart[], fromPressure: number, untilPressure: number): Phase {
  const components = parts.map(({ material }) => ({ material: material.name, phase: phaseAt(material, fromPressure) }));
  const phases = components.map(({ phase }) => phase);
  return {
    name: phases.map(({ name }) => name).join("+"),
    form: "mixture",
    curve: mixCurves(phases.map(({ curve }, i) => ({ curve, massFraction: parts[i].massFraction }))),
    fromPressure,
    untilPressure,
    calibratedTo: Math.min(...phases.map(({ calibratedTo }) => calibratedTo)),
    source: {
      citation: [...new Set(phases.map(({ source }) => source.citation))].join("; "),
      note: "volumes add at equal pressure",
    },
    components,
  };
}
