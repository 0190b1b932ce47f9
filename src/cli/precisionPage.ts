import type { FigureValue } from "../figures/figureSpec.ts";
import { layersInWords } from "../figures/massRadiusCurves.ts";
import { precisionFigure } from "../figures/precisionFigure.ts";
import { precisionHtml } from "../figures/precisionHtml.ts";
import type { ErrorPair } from "../figures/precisionSpec.ts";
import type { Measurement } from "../inference/measurement.ts";
import { errorSizes, isMeasured } from "../inference/precision/plannedMeasurement.ts";
import type { Contrast } from "../inference/precision/separation.ts";
import type { PairLabels } from "../inference/precision/statement.ts";
import type { SplitNormal } from "../inference/splitNormal.ts";
import type { Composition } from "../library/composition.ts";
import { sourcesOf } from "../library/sources.ts";
import { EARTH_MASS } from "../units/constants.ts";
import type { EarthRadius } from "./earthRadius.ts";
import { plotlySource } from "./plotlySource.ts";
import { reproducingCommand } from "./provenance.ts";
import type { Table } from "./table.ts";
import { version } from "./version.ts";

/** What a page of one planet's forecast shows. */
export interface PrecisionPart {
  readonly labels: PairLabels;
  readonly present: Measurement;
  readonly contrast: Contrast;
  readonly levels: readonly number[];
  /** [%], rising. */
  readonly massErrors: readonly number[];
  /** [%], rising. */
  readonly radiusErrors: readonly number[];
  readonly steps: Table;
  readonly compositions: readonly Composition[];
  readonly warnings: readonly string[];
  readonly notes: readonly string[];
}

/** The self-contained page with the contour map, as HTML. */
export async function precisionPage(
  part: PrecisionPart,
  run: { earthRadius: EarthRadius; args: readonly string[] },
): Promise<string> {
  const { present, contrast, labels, compositions } = part;
  const { mass, radius } = present;
  const figure = precisionFigure({
    title: `How well must a planet be measured to tell ${labels[0]} from ${labels[1]}?`,
    labels,
    gap: (100 * contrast.gap) / radius.mode,
    slope: (contrast.slope * mass.mode) / radius.mode,
    mass: estimate(mass, EARTH_MASS),
    radius: estimate(radius, run.earthRadius.value),
    present: presentErrors(present),
    massErrors: part.massErrors,
    radiusErrors: part.radiusErrors,
    levels: part.levels,
    steps: figureSteps(part.steps),
    caption: {
      warnings: part.warnings.map(sentence),
      notes: part.notes.map(sentence),
      compositions: compositions.map(({ name, title, layers }) => ({ name, title, layers: layersInWords(layers) })),
      sources: sourcesOf(compositions),
      earthRadius: `1 Earth radius = ${run.earthRadius.value / 1e3} km`,
      version,
      command: reproducingCommand(run.args),
    },
  });
  return precisionHtml(figure, await plotlySource());
}

function presentErrors(present: Measurement): ErrorPair | null {
  if (!isMeasured(present.mass) || !isMeasured(present.radius)) return null;
  const errors = errorSizes(present);
  return {
    massError: (100 * errors.mass) / present.mass.mode,
    radiusError: (100 * errors.radius) / present.radius.mode,
  };
}

function estimate(quantity: SplitNormal, unit: number) {
  const { mode, minus, plus } = quantity;
  return isMeasured(quantity)
    ? { value: mode / unit, minus: minus / unit, plus: plus / unit }
    : { value: mode / unit, minus: null, plus: null };
}

/** The table of the run under the headings of a page: `mass_error_percent` reads `mass error percent` there. */
function figureSteps({ columns, rows }: Table) {
  return {
    columns: columns.map((column) => ({ title: column.replaceAll("_", " ") })),
    rows: rows.map((row) => row.map((cell): FigureValue => (typeof cell === "bigint" ? Number(cell) : (cell ?? null)))),
  };
}

function sentence(note: string): string {
  return `${note.charAt(0).toUpperCase()}${note.slice(1)}.`;
}
