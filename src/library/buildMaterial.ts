import type { Material } from "../eos/material.ts";
import { type PhaseSpec, stackPhases } from "../eos/phaseStack.ts";
import { mantlePhases } from "../mineralogy/mantlePhases.ts";
import { GPA } from "../units/constants.ts";
import { rockMelting, warmMaterial, warmPhase, waterMaterial } from "./buildWarm.ts";
import { buildCurve, type TableReader } from "./forms.ts";
import type { MaterialFile, PhaseEntry } from "./schemas.ts";

/** The material a file describes. Throws InputError where parameters, ends or densities of its phases do not fit. */
export function buildMaterial(file: MaterialFile, readTable: TableReader): Material {
  const { material, title, phases = [], mantle, water, source } = file;
  const what = { name: material, title, ...(source && { source }) };
  if (water) return waterMaterial(what);
  if (mantle) return warmMaterial({ ...what, melting: rockMelting }, mantlePhases(mantle));
  if (phases[0].thermal) {
    return warmMaterial(
      what,
      phases.map((phase, i) => warmPhase(phase, phases[i - 1])),
    );
  }
  return { ...coldMaterial(material, title, phases, readTable), ...what };
}

function coldMaterial(name: string, title: string, phases: readonly PhaseEntry[], readTable: TableReader): Material {
  const specs = phases.map(({ phase, eos, untilGPa, untilCrossing, calibratedToGPa, source }): PhaseSpec => {
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
  return stackPhases(name, title, specs);
}
