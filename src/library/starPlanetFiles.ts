import type { Source } from "../eos/material.ts";
import type { StarPlanet } from "../mineralogy/planetFromStar.ts";
import type { LibraryFile } from "./libraryFiles.ts";

/** The default material for iron cores. */
const CORE = "iron-birch-2025";

/** Digits that outlast any error of an abundance and read well in a file. */
const rounded = (value: number): number => Number(value.toPrecision(12));

/**
 * The planet that a star's abundances imply as library files: a composition of that name, and its mantle's material
 * under `materials/`.
 * Checked test/library/starPlanetFiles.test.ts
 */
export function starPlanetFiles(planet: StarPlanet, name: string, source: Source): LibraryFile[] {
  const { mean } = planet.coreMassFraction;
  const core = rounded(mean);
  const mantle = `${name}-mantle`;
  return [
    jsonFile(`${name}.json`, {
      composition: name,
      title: `Planet made of its star's rock and iron: ${(100 * core).toPrecision(3)} % core`,
      source,
      layers: [
        { material: CORE, massFraction: core },
        { material: mantle, massFraction: rounded(1 - core) },
      ],
    }),
    jsonFile(`materials/${mantle}.json`, {
      material: mantle,
      title: `Mantle of ${name} as Mg-Fe-Si-O minerals`,
      mantle: {
        magnesiumToSilicon: rounded(planet.mantle.magnesiumToSilicon),
        ironNumber: rounded(planet.mantle.ironNumber),
      },
      source,
    }),
  ];
}

function jsonFile(path: string, content: object): LibraryFile {
  return { path, text: `${JSON.stringify(content, null, 2)}\n` };
}
