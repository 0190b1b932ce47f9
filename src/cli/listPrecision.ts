import { setImmediate } from "node:timers/promises";
import type { Improved } from "../inference/precision/improvementSteps.ts";
import { buildPrecisionModels } from "../inference/precision/precisionModels.ts";
import { type PlanetWorth, planetWorth, rankPlanets } from "../inference/precision/rankPlanets.ts";
import type { PlanetRow } from "../planets/quantity.ts";
import { allOf, interruptible } from "./interruptible.ts";
import { keptColumns } from "./keptColumns.ts";
import { openPlanetList, type PlanetListFile } from "./planetListFile.ts";
import { methodNotes } from "./precisionNotes.ts";
import { type Halving, type PrecisionRun, usedCompositions } from "./precisionRun.ts";
import { type Progress, startProgress } from "./progress.ts";
import { provenanceOf } from "./provenance.ts";
import { emitTable, tell } from "./resultOptions.ts";
import { type WorthPlan, worthColumns, worthTable } from "./worthTable.ts";

/** Ranks the planets of a list by what smaller errors would teach. */
export async function listPrecision(file: PlanetListFile, run: PrecisionRun): Promise<void> {
  const { options, context, library, family } = run;
  const { io, args } = context;
  const earthRadius = options.earthRadiusKm;
  const list = await openPlanetList(file, io);
  const plan: WorthPlan = {
    labels: options.between,
    levels: options.sigma,
    choices: choicesOf(options.halve),
    fraction: family.column,
    earthRadius: earthRadius.value,
  };
  const header = list.columns.map(({ name }) => name);
  const kept = keptColumns(options.keep ?? [], header, worthColumns(plan), list.file);
  const notes = [...library.notes, ...list.notes];
  tell(notes, options, io);

  const rows = await allOf(list.rows);
  const progress = startProgress(rows.length, io, options.quiet);
  const planets = await ranked(rows, run, plan, progress).finally(() => progress.stop());
  const provenance = provenanceOf({
    args,
    earthRadius,
    compositions: usedCompositions(run),
    notes: [...notes, ...methodNotes(options.between, family)],
  });
  await emitTable(worthTable(planets, plan, kept), provenance, options, io);
}

async function ranked(
  rows: readonly PlanetRow[],
  { pair: [a, b], family: { family } }: PrecisionRun,
  { choices }: WorthPlan,
  progress: Progress,
): Promise<PlanetWorth[]> {
  await setImmediate(); // shows the bar before the models are solved
  const models = buildPrecisionModels({ a, b, family });
  const planets: PlanetWorth[] = [];
  for await (const row of interruptible(rows)) {
    planets.push(planetWorth(row, models, choices));
    progress.advanceTo(planets.length);
  }
  return rankPlanets(planets);
}

function choicesOf(halving: Halving = "either"): readonly Improved[] {
  return halving === "either" ? ["mass", "radius"] : [halving];
}
