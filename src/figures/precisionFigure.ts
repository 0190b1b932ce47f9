import { formatValue, plainNumber } from "./formatValue.ts";
import { logRange } from "./logRange.ts";
import type { PrecisionInput, PrecisionSpec, SeparationContour, SeparationGrid } from "./precisionSpec.ts";
import { separationContour } from "./separationContour.ts";

/** From this separation down, in sigma, two compositions are degenerate; always drawn. */
const degenerate = 1;

/**
 * The map of how far apart two compositions are for errors of mass and radius, as data.
 * Checked by test/figures/precisionFigure.test.ts.
 */
export function precisionFigure(input: PrecisionInput): PrecisionSpec {
  const { massErrors, radiusErrors, present, labels } = input;
  const axes = {
    massError: {
      title: "Relative error of the mass",
      unit: "%",
      range: logRange([...massErrors, ...(present ? [present.massError] : [])]),
    },
    radiusError: {
      title: "Relative error of the radius",
      unit: "%",
      range: logRange([...radiusErrors, ...(present ? [present.radiusError] : [])]),
    },
  };
  const levels = [...new Set([degenerate, ...input.levels])].sort((p, q) => p - q);
  const contours = levels.map((sigma) => separationContour(input, sigma, axes));
  return {
    kind: "precision",
    title: input.title,
    summary: summary(input),
    axes,
    contours,
    present,
    grid: separationGrid(input),
    steps: input.steps,
    caption: { ...input.caption, notes: [...readingNotes(labels, contours, present !== null), ...input.caption.notes] },
  };
}

function separationGrid({ massErrors, radiusErrors, gap, slope }: PrecisionInput): SeparationGrid {
  const separation = massErrors.map((mass) => radiusErrors.map((radius) => gap / Math.hypot(radius, slope * mass)));
  return { massErrors, radiusErrors, separation };
}

function summary({ labels, gap, slope, mass, radius }: PrecisionInput): string {
  return (
    `How far apart ${labels[0]} and ${labels[1]} are, in sigma, for a planet of ${formatValue(mass)} Earth masses and ` +
    `${formatValue(radius)} Earth radii. The two radii differ by ${plainNumber(gap, 3)} % of the planet's; ` +
    `1 % of the mass changes them by ${plainNumber(slope, 3)} %.`
  );
}

function readingNotes(
  labels: PrecisionInput["labels"],
  contours: readonly SeparationContour[],
  hasPresent: boolean,
): string[] {
  return [
    "Each line joins the errors that give one separation; the stronger the shading, the larger it is. " +
      degeneracyNote(labels, contours),
    "Where a line runs level the radius error limits, and a better mass buys nothing; where it falls steeply the mass error does.",
    ...(hasPresent ? ["The filled circle marks today's errors."] : []),
  ];
}

function degeneracyNote([a, b]: PrecisionInput["labels"], contours: readonly SeparationContour[]): string {
  const boundary = contours.find(({ sigma }) => sigma === degenerate);
  const meaning = `${a} and ${b} are degenerate: such errors do not tell them apart.`;
  if (boundary && boundary.line.length > 0) return `Above and right of the line of ${boundary.label} ${meaning}`;
  if (boundary && boundary.region.length > 0)
    return `All errors of this map separate the two by more than ${boundary.label}.`;
  return `On all of this map ${meaning}`;
}
