import { plainNumber } from "./formatValue.ts";
import type { ErrorPair, PrecisionSpec, SeparationContour } from "./precisionSpec.ts";

const points = 81;

type Axes = PrecisionSpec["axes"];

/**
 * The errors with which a separation gap / sqrt(radiusError² + (slope · massError)²) is `sigma`: a quarter of an
 * ellipse, cut off at the axes.
 * Checked by test/figures/precisionFigure.test.ts.
 */
export function separationContour(
  { gap, slope }: { readonly gap: number; readonly slope: number },
  sigma: number,
  axes: Axes,
): SeparationContour {
  const line = quarterEllipse(gap / sigma, slope, axes);
  const atLargestErrors = gap / Math.hypot(axes.radiusError.range[1], slope * axes.massError.range[1]);
  const region = atLargestErrors > sigma ? wholeMap(axes) : underLine(line, axes);
  return { sigma, label: `${plainNumber(sigma, 3)} sigma`, line, region };
}

/** Evenly spaced in ln tan of the angle along the ellipse, which suits logarithmic axes. */
function quarterEllipse(allowed: number, slope: number, { massError, radiusError }: Axes): ErrorPair[] {
  const atMassError = (error: number) => logTangent(slope * error, allowed);
  const atRadiusError = (error: number) => -logTangent(error, allowed);
  const from = Math.max(atMassError(massError.range[0]), atRadiusError(radiusError.range[1]));
  const to = Math.min(atMassError(massError.range[1]), atRadiusError(radiusError.range[0]));
  if (!(from < to)) return [];
  return Array.from({ length: points }, (_, i) => {
    const tangent = Math.exp(from + ((to - from) * i) / (points - 1));
    const radius = allowed / Math.hypot(1, tangent);
    return { massError: (tangent * radius) / slope, radiusError: radius };
  });
}

/** ln tan φ for sin φ = part / whole; infinite where the part is larger. */
function logTangent(part: number, whole: number): number {
  return part < whole ? Math.log(part) - 0.5 * Math.log(whole ** 2 - part ** 2) : Number.POSITIVE_INFINITY;
}

function underLine(line: readonly ErrorPair[], { massError, radiusError }: Axes): ErrorPair[] {
  if (line.length === 0) return [];
  const [lowMass, lowRadius] = [massError.range[0], radiusError.range[0]];
  return [
    ...line,
    { massError: line[line.length - 1].massError, radiusError: lowRadius },
    { massError: lowMass, radiusError: lowRadius },
    { massError: lowMass, radiusError: line[0].radiusError },
  ];
}

function wholeMap({ massError, radiusError }: Axes): ErrorPair[] {
  const [[left, right], [bottom, top]] = [massError.range, radiusError.range];
  return [
    { massError: left, radiusError: top },
    { massError: right, radiusError: top },
    { massError: right, radiusError: bottom },
    { massError: left, radiusError: bottom },
  ];
}
