import { presentProportion } from "../inference/precision/improvementSteps.ts";
import { forecastSteps } from "../inference/precision/planetForecast.ts";
import { presentMeasurement } from "../inference/precision/plannedMeasurement.ts";
import { buildPrecisionModels } from "../inference/precision/precisionModels.ts";
import { contrastAt } from "../inference/precision/separation.ts";
import type { SplitNormal } from "../inference/splitNormal.ts";
import { EARTH_MASS } from "../units/constants.ts";
import { parsePercentages, type ValueWithErrors } from "./numberOptions.ts";
import { writeOutputFile } from "./outputFile.ts";
import { methodNotes, placeNotes, planetWarnings } from "./precisionNotes.ts";
import { precisionPage } from "./precisionPage.ts";
import { type PrecisionRun, usedCompositions } from "./precisionRun.ts";
import { provenanceOf } from "./provenance.ts";
import { emitTable, tell } from "./resultOptions.ts";
import { stepTable } from "./stepTable.ts";

const defaultMassErrors = parsePercentages("1,2,3,5,7,10,15,20,30,50");
const defaultRadiusErrors = parsePercentages("0.5,1,1.5,2,3,4,5,7,10,15,20");

/** What errors of one planet are needed and what they buy, as a table and a map. */
export async function planetPrecision(run: PrecisionRun): Promise<void> {
  const { options, context, library, pair, family } = run;
  const { between: labels, sigma: levels, earthRadiusKm: earthRadius } = options;
  tell(library.notes, options, context.io);
  const [a, b] = pair;
  const models = buildPrecisionModels({ a, b, family: family.family });
  const present = presentMeasurement(
    { mass: inSi(options.massEarth, EARTH_MASS), radius: inSi(options.radiusEarth, earthRadius.value) },
    models,
  );
  const contrast = contrastAt(models, present.mass.mode);
  const massPerRadius = options.proportion ?? presentProportion(present);
  const steps = forecastSteps(present, contrast, models, { levels, massPerRadius });

  const warnings = planetWarnings(present, steps, labels);
  const remarks = [
    ...placeNotes(present, models, labels),
    `both errors together: the relative mass error is ${massPerRadius.toPrecision(3)} times that of the radius`,
  ];
  const compositions = usedCompositions(run);
  const table = stepTable(steps, present, labels, family.column);
  const notes = [...library.notes, ...methodNotes(labels, family), ...warnings, ...remarks];
  const { args, io } = context;
  await emitTable(table, provenanceOf({ args, earthRadius, compositions, notes }), options, io);
  if (options.html === undefined) return;
  const part = {
    labels,
    present,
    contrast,
    levels,
    massErrors: rising(options.massErrorsPercent ?? defaultMassErrors),
    radiusErrors: rising(options.radiusErrorsPercent ?? defaultRadiusErrors),
    steps: table,
    compositions,
    warnings,
    notes: remarks,
  };
  await writeOutputFile(options.html, await precisionPage(part, { args, earthRadius }));
}

function inSi(given: ValueWithErrors | undefined, unit: number): SplitNormal | undefined {
  return given && { mode: given.value * unit, minus: given.minus * unit, plus: given.plus * unit };
}

function rising(values: readonly number[]): number[] {
  return [...new Set(values)].sort((p, q) => p - q);
}
