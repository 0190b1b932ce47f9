import { describe, expect, test } from "vitest";
import { checkLibrary } from "../../src/library/checkLibrary.ts";
import { familyMember } from "../../src/library/family.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { thrownBy } from "../support/thrownBy.ts";
import { json } from "./files.ts";

const components = [
  { name: "core", material: "iron-vinet-2018" },
  { name: "rock", composition: "silicate" },
  { name: "sea", composition: "water" },
];
const familyFile = (content: object) =>
  json("mine/families/f.json", { family: "f", title: "F", components, ...content });
const libraryWith = (content: object) => loadLibrary([...shippedFiles, familyFile(content)]);

describe("families", () => {
  test("that are shipped can all be built", () => {
    const library = loadLibrary(shippedFiles);
    expect(library.families.map(({ name }) => name).sort()).toEqual([
      "earth-like-water",
      "iron-silicate",
      "iron-silicate-water",
      "silicate-water",
    ]);
    for (const { name } of library.families) expect(library.family(name).components.length).toBeGreaterThan(1);
  });

  test("are made of compositions and materials, flat unless they say otherwise", () => {
    const family = libraryWith({}).family("f");
    expect(family.components.map(({ name, composition }) => [name, composition.layers[0].name])).toEqual([
      ["core", "iron-vinet-2018"],
      ["rock", "magnesium-silicate"],
      ["sea", "water-ice-vii"],
    ]);
    expect(family.prior).toEqual({ fractions: "flat", logUniform: [], normal: [] });
  });

  test("have members whose layers keep their shares; absent components have none", () => {
    const library = loadLibrary(shippedFiles);
    const member = familyMember(library.family("earth-like-water"), [0.8, 0.2]);
    expect(member.layers.map(({ massFraction }) => Number(massFraction.toFixed(12)))).toEqual([0.26, 0.54, 0.2]);
    expect(familyMember(library.family("earth-like-water"), [0, 1]).layers).toHaveLength(1);
    expect(member.surface).toEqual(library.composition("water").surface);
  });

  test("may be given as a file that lies anywhere", () => {
    const file = { ...familyFile({ family: "g" }), path: "anywhere.json", kind: "family" as const };
    expect(loadLibrary([...shippedFiles, file]).family("g").name).toBe("g");
  });

  test.each([
    [
      "an unknown component in the prior",
      { prior: { logUniform: [{ component: "gas", from: 1e-4, to: 0.2 }] } },
      /"gas" is not a component/,
    ],
    ["bounds that are none", { prior: { logUniform: [{ component: "sea", from: 0.2, to: 0.1 }] } }, /must be below/],
    [
      "a share of others",
      { prior: { normal: [{ component: "core", among: ["sea"], mean: 0.3, sigma: 0.1 }] } },
      /component itself/,
    ],
    ["two components of one name", { components: [components[0], components[0]] }, /already the name/],
    [
      "a component of both kinds",
      { components: [{ name: "x", material: "iron-vinet-2018", composition: "iron" }] },
      /exactly one/,
    ],
    [
      "no component left to fill up",
      { components: [components[0]], prior: { logUniform: [{ component: "core", from: 0.1, to: 0.2 }] } },
      /left to fill/,
    ],
    ["a misspelt key", { titel: "x" }, /titel/],
  ])("with %s are refused", (_, content, message) => {
    expect(thrownBy(() => libraryWith(content).family("f"))).toHaveProperty("message", expect.stringMatching(message));
    expect(checkLibrary([familyFile(content)], shippedFiles)).toHaveLength(1);
  });

  test("of an unknown name or material name what is known", () => {
    expect(thrownBy(() => libraryWith({}).family("iron-silicat"))).toHaveProperty("code", "unknown-family");
    const content = { components: [{ name: "x", material: "irn-vinet-2018" }] };
    expect(thrownBy(() => libraryWith(content).family("f"))).toHaveProperty("code", "unknown-material");
  });
});
