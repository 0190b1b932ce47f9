import type { CurvePoint } from "../curve/sweep.ts";
import { massRadiusFigure } from "../figures/massRadiusFigure.ts";
import type { CurveInput, MassRadiusInput } from "../figures/massRadiusInput.ts";
import { plotlyHtml } from "../figures/plotlyHtml.ts";
import type { Composition } from "../library/composition.ts";
import { sourcesOf } from "../library/sources.ts";
import { EARTH_MASS } from "../units/constants.ts";
import type { EarthRadius } from "./earthRadius.ts";
import { plotlySource } from "./plotlySource.ts";
import { reproducingCommand } from "./provenance.ts";
import { version } from "./version.ts";

export interface Curve {
  readonly composition: Composition;
  readonly points: readonly CurvePoint[];
}

/** What only a list of planets adds to a mass–radius page. */
export type PlanetPart = Pick<MassRadiusInput, "title" | "planets" | "columns" | "verdicts" | "warnings">;

/** The self-contained page with the mass–radius diagram, as HTML. */
export async function massRadiusPage(
  curves: readonly Curve[],
  part: PlanetPart,
  run: { earthRadius: EarthRadius; args: readonly string[] },
): Promise<string> {
  const figure = massRadiusFigure({
    ...part,
    curves: curves.map((curve) => curveInput(curve, run.earthRadius.value)),
    sources: sourcesOf(curves.map(({ composition }) => composition)),
    earthRadiusKm: run.earthRadius.value / 1e3,
    version,
    command: reproducingCommand(run.args),
  });
  return plotlyHtml(figure, await plotlySource());
}

function curveInput({ composition, points }: Curve, earthRadius: number): CurveInput {
  return {
    composition: composition.name,
    title: composition.title,
    layers: composition.layers,
    points: points.map(({ mass, planet }) => ({
      massEarth: mass / EARTH_MASS,
      radiusEarth: planet ? planet.radius / earthRadius : null,
      extrapolatedLayers: planet?.extrapolatedLayers ?? [],
    })),
  };
}
