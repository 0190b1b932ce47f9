import { expect, test } from "vitest";
import { alternativeCompositions } from "../../src/library/alternatives.ts";
import { checkLibrary } from "../../src/library/checkLibrary.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { cold, compositionOf, hcpIron, materialOf } from "../support/warmFiles.ts";

const library = loadLibrary(shippedFiles);
const layersOf = (name: string) =>
  alternativeCompositions(library, name).map(({ composition }) => composition.layers.map((layer) => layer.name));

test("every combination of the sets of the materials, the composition itself first", () => {
  const layers = layersOf("earth-like");
  expect(layers).toHaveLength(8);
  expect(layers[0]).toEqual(library.composition("earth-like").layers.map(({ name }) => name));
  expect(new Set(layers.map((names) => names.join())).size).toBe(8);
});

test("inside mixtures and named compositions too", () => {
  expect(layersOf("coreless")).toContainEqual(["iron-vinet-2018+magnesium-silicate-2016"]);
  expect(layersOf("earth-like-water-10")).toContainEqual([
    "iron-vinet-2007",
    "magnesium-silicate",
    "water-ice-vii-2004",
  ]);
  expect(layersOf("iron-birch-2025")).toContainEqual(["iron-vinet-2007"]);
});

test("the composition alone where its materials list none", () => {
  expect(layersOf("earth")).toHaveLength(1);
});

test("substitutes leave the library as it was", () => {
  const before = library.composition("earth-like");
  alternativeCompositions(library, "earth-like");
  expect(library.composition("earth-like")).toBe(before);
});

test("an alternative that is not there is a problem of the folder", () => {
  const { text, path } = materialOf("own-iron", cold(hcpIron));
  const file = { path, text: JSON.stringify({ ...JSON.parse(text), alternatives: ["iron-of-nowhere"] }) };
  const problems = checkLibrary(
    [file, compositionOf("own", [{ material: "own-iron", massFraction: 1 }])],
    shippedFiles,
  );
  expect(problems.map(({ code }) => code)).toContain("unknown-material");
});
