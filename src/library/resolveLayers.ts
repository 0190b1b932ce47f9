import type { Material } from "../eos/material.ts";
import { mixMaterials } from "../eos/mixMaterials.ts";
import { InputError } from "../errors.ts";
import type { Composition, Layer } from "./composition.ts";
import type { CompositionFile, PartEntry } from "./schemas.ts";

/** How a layer's names become things; `key` is where the name stands in the file. */
export interface NameLookup {
  material(name: string, key: string): Material;
  composition(name: string, key: string): Composition;
}

/** The layers of a composition file, nested compositions expanded and scaled, empty ones dropped, summing to 1. */
export function resolveLayers(file: CompositionFile, lookup: NameLookup): Layer[] {
  const layers = file.layers.flatMap(({ material, mixture, composition, massFraction, ...heat }, i): Layer[] => {
    const key = `layers[${i}]`;
    if (composition !== undefined) {
      const inner = lookup.composition(composition, `${key}.composition`);
      if (inner.envelope !== undefined) throw envelopeInside(composition, key);
      return inner.layers.map((layer, j) => ({
        ...layer,
        massFraction: layer.massFraction * massFraction,
        ...(j === inner.layers.length - 1 && heating(heat)),
      }));
    }
    const substance =
      material === undefined ? mix(mixture ?? [], key, lookup) : lookup.material(material, `${key}.material`);
    return [{ name: substance.name, material: substance, massFraction, ...heating(heat) }];
  });
  return normalised(layers.filter(({ massFraction }) => massFraction > 0));
}

function envelopeInside(composition: string, key: string): InputError {
  return new InputError(
    "envelope-inside",
    `${key}.composition: "${composition}" ends in a gas envelope, and gas cannot lie inside a planet; ` +
      "name a composition without one and give the envelope here.",
    { column: `${key}.composition`, found: composition },
  );
}

function heating(keys: { temperatureJumpK?: number; topTemperatureK?: number }): Pick<Layer, "heating"> {
  if (keys.topTemperatureK !== undefined) return { heating: { top: keys.topTemperatureK } };
  return keys.temperatureJumpK === undefined ? {} : { heating: { jump: keys.temperatureJumpK } };
}

function mix(parts: readonly PartEntry[], key: string, lookup: NameLookup): Material {
  const resolved = parts.map(({ material, massFraction }, i) => ({
    material: lookup.material(material, `${key}.mixture[${i}].material`),
    massFraction,
  }));
  const present = resolved.filter(({ massFraction }) => massFraction > 0);
  const warm = present.find(({ material }) => material.warmed);
  if (present.length > 1 && warm) {
    throw new InputError(
      "mixture-temperature",
      `${key}.mixture: "${warm.material.name}" depends on temperature, and a mixture has none here; ` +
        "give its parts as layers, or use materials without temperature.",
      { column: `${key}.mixture`, found: warm.material.name },
    );
  }
  return mixMaterials(normalised(present));
}

/** Beyond what adding a few fractions in binary loses. */
const ROUNDING = 1e-14;

/** Takes out what the check of the file tolerates, so that the fractions sum to 1 to rounding. */
function normalised<Part extends { massFraction: number }>(parts: Part[]): Part[] {
  const sum = parts.reduce((total, { massFraction }) => total + massFraction, 0);
  if (Math.abs(sum - 1) <= ROUNDING) return parts;
  return parts.map((part) => ({ ...part, massFraction: part.massFraction / sum }));
}
