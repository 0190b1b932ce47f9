import { type Phase, phaseAt } from "../eos/material.ts";
import type { Composition, Layer } from "../library/composition.ts";

/** Pressure and temperature at the top of a layer. SI. */
export interface LayerTop {
  readonly pressure: number;
  readonly temperature: number;
}

/**
 * Turns a composition with temperature into one of plain pressure–density curves. Within a layer temperature depends on
 * pressure alone once its top is known, so the curves hold it and the structure solver need not know of it. Works from
 * the surface down; what depends on the outermost layer only is kept, as it never changes.
 */
export class WarmLayers {
  private readonly composition: Composition;
  private readonly layers: Layer[];
  private outermost: Layer | undefined;

  constructor(composition: Composition) {
    this.composition = composition;
    this.layers = [...composition.layers];
  }

  /** `topPressures` are those of all layers but the outermost, centre to surface [Pa]. */
  resolve(topPressures: readonly number[]): Composition {
    const { composition, layers } = this;
    const last = layers.length - 1;
    this.outermost ??= warm(composition, layers[last], this.surfaceTop());
    const resolved = [...layers];
    resolved[last] = this.outermost;
    let temperature = this.surfaceTop().temperature;
    for (let i = last - 1; i >= 0; i--) {
      const pressure = topPressures[i];
      temperature = topTemperature(layers[i], temperatureAt(resolved[i + 1], pressure, temperature));
      resolved[i] = warm(composition, layers[i], { pressure, temperature });
    }
    return { ...composition, layers: resolved };
  }

  private surfaceTop(): LayerTop {
    const { surface, temperature } = this.composition;
    return { pressure: surface.pressurePa, temperature: temperature?.top ?? surface.temperatureK };
  }
}

/** A layer whose material answers to no temperature stays as it is. */
function warm({ temperature }: Composition, layer: Layer, top: LayerTop): Layer {
  const { material } = layer;
  if (temperature === undefined || material.warmed === undefined) return layer;
  const phases: readonly Phase[] = material.warmed(temperature.mode, top.pressure, top.temperature);
  // One by one: `phases`, those of a cold planet, would be made for nothing.
  const { name, title, source, everyPhase, melting } = material;
  return { ...layer, material: { name, title, source, everyPhase, melting, phases } };
}

function topTemperature({ heating }: Layer, above: number): number {
  if (heating === undefined) return above;
  return "top" in heating ? heating.top : above + heating.jump;
}

/** Temperature in a resolved layer; one without temperature passes on what it got from above. */
function temperatureAt({ material }: Layer, pressure: number, above: number): number {
  const { curve } = phaseAt(material, pressure);
  return curve.temperature?.(curve.coordinate(pressure)) ?? above;
}
