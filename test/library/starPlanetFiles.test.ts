import { expect, test } from "vitest";
import { checkLibrary } from "../../src/library/checkLibrary.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { starPlanetFiles } from "../../src/library/starPlanetFiles.ts";
import { parseAbundances } from "../../src/mineralogy/abundances.ts";
import { planetFromStar } from "../../src/mineralogy/planetFromStar.ts";
import { expectClose } from "../support/expectClose.ts";

const planet = planetFromStar(parseAbundances("Fe/Mg=0.81,Si/Mg=0.91"), 0.1);
const files = starPlanetFiles(planet, "tau", { citation: "invented for a test, 2026" });

test("the files of a star's planet stand up to the checks of any library", () => {
  expect(checkLibrary(files, shippedFiles)).toEqual([]);
});

test("they hold its core and its mantle's atoms", () => {
  const { layers } = loadLibrary([...shippedFiles, ...files]).composition("tau");
  expect(layers.map(({ name }) => name)).toEqual(["iron-birch-2025", "tau-mantle"]);
  expectClose(layers[0].massFraction, planet.coreMassFraction.mean, { rel: 1e-11, because: "12 digits written" });
  const { mantle } = JSON.parse(files[1].text);
  expectClose(mantle.magnesiumToSilicon, 1 / 0.91, { rel: 1e-11, because: "12 digits written" });
  expectClose(mantle.ironNumber, 0.081 / 1.081, { rel: 1e-11, because: "12 digits written" });
});
