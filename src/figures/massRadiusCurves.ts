import type { FigureCurve } from "./figureSpec.ts";
import { plainNumber } from "./formatValue.ts";
import type { CurveInput } from "./massRadiusInput.ts";

const longestLabel = 30;

/** Curves in drawing form, each with a label that no other curve has. */
export function figureCurves(inputs: readonly CurveInput[]): FigureCurve[] {
  const short = inputs.map(({ title }) => (title.split(":")[0] ?? "").trim());
  return inputs.map((input, i) => {
    const own = short[i] ?? "";
    const usable = own !== "" && own.length <= longestLabel && short.indexOf(own) === short.lastIndexOf(own);
    return figureCurve(input, usable ? own : input.composition);
  });
}

function figureCurve({ composition, title, points }: CurveInput, label: string): FigureCurve {
  const sorted = [...points].sort((a, b) => a.massEarth - b.massEarth);
  const beyond = sorted.find((point) => point.extrapolatedLayers.length > 0);
  return {
    composition,
    label,
    title,
    mass: sorted.map((point) => point.massEarth),
    radius: sorted.map((point) => point.radiusEarth),
    extrapolatedFrom: beyond?.massEarth ?? null,
  };
}

/** The layers of a composition in words, from the centre outwards. */
export function layersInWords(layers: CurveInput["layers"]): string {
  const parts = layers.map(({ name, massFraction }) => `${plainNumber(massFraction * 100, 4)} % ${name}`);
  return parts.length > 1 ? `${parts.join(", ")} (centre to surface)` : parts.join("");
}

/** Says where curves leave the data behind their equations of state; undefined if none does. */
export function extrapolationWarning(curves: readonly FigureCurve[]): string | undefined {
  const parts = curves.flatMap(({ label, extrapolatedFrom }) =>
    extrapolatedFrom === null ? [] : [`${label} from ${plainNumber(extrapolatedFrom, 3)}`],
  );
  if (parts.length === 0) return undefined;
  return `Dashed parts of curves lie beyond the data behind an equation of state (Earth masses): ${parts.join("; ")}.`;
}
