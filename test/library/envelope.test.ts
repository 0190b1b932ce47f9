import { describe, expect, it } from "vitest";
import { loadLibrary } from "../../src/library/library.ts";
import { constants } from "../../src/units/constants.ts";
import { cold, compositionOf, hcpIron, materialOf } from "../support/warmFiles.ts";

const layers = [{ material: "own-iron", massFraction: 1 }];
const envelope = { massFraction: 0.02, fluxEarth: 10, ageGyr: 5, opacity: "solar" };
const library = loadLibrary([
  materialOf("own-iron", cold(hcpIron)),
  compositionOf("gaseous", layers, { envelope }),
  compositionOf("open", layers, { envelope: { massFraction: 0.02, opacity: "enhanced" } }),
  compositionOf("gas-inside", [{ composition: "gaseous", massFraction: 1 }]),
  compositionOf("all-gas", layers, { envelope: { ...envelope, massFraction: 1 } }),
  compositionOf("opaque", layers, { envelope: { ...envelope, opacity: "high" } }),
]);

describe("the envelope of a composition file", () => {
  it("is read into SI", () => {
    expect(library.composition("gaseous").envelope).toEqual({
      massFraction: 0.02,
      flux: 10 * 1361,
      age: 5e9 * constants.julianYear.value,
      opacity: "solar",
    });
  });

  it("may leave flux and age to the run", () => {
    expect(library.composition("open").envelope).toEqual({ massFraction: 0.02, opacity: "enhanced" });
  });

  it.each([
    ["gas-inside", "envelope-inside"],
    ["all-gas", "wrong-value"],
    ["opaque", "wrong-value"],
  ])("%s is refused", (name, code) => {
    expect(() => library.composition(name)).toThrow(expect.objectContaining({ code }));
  });
});
