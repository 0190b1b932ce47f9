import type { Material } from "../eos/material.ts";
import { type PhaseSpec, stackPhases } from "../eos/phaseStack.ts";
import { GPA } from "../units/constants.ts";
import { buildCurve, type TableReader } from "./forms.ts";
import type { MaterialFile } from "./schemas.ts";

/** The material a file describes. Throws InputError where parameters, ends or densities of its phases do not fit. */
export function buildMaterial(file: MaterialFile, readTable: TableReader): Material {
  const specs = file.phases.map(({ phase, eos, untilGPa, untilCrossing, calibratedToGPa, source }): PhaseSpec => {
    const curve = buildCurve(eos, readTable);
    const tableEnd = eos.form === "table" && curve !== "bridge" ? curve.maxPressure : Number.POSITIVE_INFINITY;
    return {
      name: phase,
      form: eos.form,
      curve,
      until: untilCrossing ? "crossing" : untilGPa === undefined ? Number.POSITIVE_INFINITY : untilGPa * GPA,
      calibratedTo: calibratedToGPa === undefined ? tableEnd : calibratedToGPa * GPA,
      source,
    };
  });
  return stackPhases(file.material, file.title, specs);
}
