import { describe, expect, test } from "vitest";
import { describe as describeName } from "../../src/library/describe.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { shippedFiles } from "../../src/library/shipped.generated.ts";
import { expectClose } from "../support/expectClose.ts";
import { composition, constantPhase, layer, material, withEos } from "./files.ts";

describe("the description of a material", () => {
  const library = loadLibrary([material("m", [constantPhase("a", 1000, { untilGPa: 50 }), constantPhase("b", 1200)])]);
  const description = describeName(library, "m");

  test("holds phases with their range, form, parameters and source", () => {
    expect(description).toMatchObject({
      kind: "material",
      name: "m",
      title: "Title of m",
      phases: [
        {
          name: "a",
          form: "constant",
          parameters: { densityKgM3: 1000 },
          fromGPa: 0,
          untilGPa: 50,
          calibratedToGPa: 10,
          source: { citation: "invented" },
        },
        { name: "b", fromGPa: 50 },
      ],
    });
  });

  test("leaves out limits that do not exist", () => {
    const [a, b] = "phases" in description ? description.phases : [];
    expect(a).not.toHaveProperty("formEndsGPa");
    expect(b).not.toHaveProperty("untilGPa");
  });

  test("holds densities at 0, 100 and 1000 GPa, and the step between phases", () => {
    expect(description).toMatchObject({
      densities: [
        { pressureGPa: 0, densityKgM3: 1000 },
        { pressureGPa: 100, densityKgM3: 1200 },
        { pressureGPa: 1000, densityKgM3: 1200 },
      ],
      joins: [{ kind: "transition", lower: "a", upper: "b", atGPa: 50 }],
    });
    const [join] = "joins" in description ? description.joins : [];
    expectClose(join.kind === "transition" ? join.step : 0, 0.2, { rel: 1e-12, because: "rounding" });
  });

  test("tells where a form ends, and gives no density beyond it", () => {
    const soft = { form: "birch-murnaghan", order: 4, bulkModulusSecondPerGPa: -0.05 };
    const eos = { ...soft, densityZeroKgM3: 4000, bulkModulusGPa: 200, bulkModulusPrime: 4 };
    const turning = describeName(loadLibrary([withEos(eos)]), "m");
    if (turning.kind !== "material") throw new Error("not a material");
    expect(turning.phases[0].formEndsGPa).toBeLessThan(1000);
    expect(turning.densities.map(({ densityKgM3 }) => densityKgM3 !== undefined)).toEqual([true, true, false]);
  });

  test("tells a crossing from a transition", () => {
    const silicate = describeName(loadLibrary(shippedFiles), "magnesium-silicate");
    expect("joins" in silicate && silicate.joins.map(({ kind }) => kind)).toEqual([
      "transition",
      "transition",
      "crossing",
    ]);
  });
});

describe("the description of a composition", () => {
  const files = [material("m"), material("n"), composition("inner", [layer("m", 0.5), layer("n", 0.5)])];
  const library = loadLibrary([
    ...files,
    composition("outer", [
      { composition: "inner", massFraction: 0.5 },
      { mixture: [layer("n", 0.5), layer("m", 0.5)], massFraction: 0.5 },
    ]),
    composition("m", [layer("n", 1)]),
  ]);

  test("holds layers from the centre outwards and every material once", () => {
    expect(describeName(library, "outer")).toMatchObject({
      kind: "composition",
      surface: { pressurePa: 0, temperatureK: 300 },
      layers: [
        { name: "m", massFraction: 0.25 },
        { name: "n", massFraction: 0.25 },
        { name: "n+m", massFraction: 0.5 },
      ],
      materials: [{ name: "m" }, { name: "n" }],
    });
  });

  test("comes before that of a material of the same name", () => {
    expect(describeName(library, "m").kind).toBe("composition");
    expect(describeName(library, "n").kind).toBe("material");
  });

  test("of an unknown name is an error", () => {
    expect(() => describeName(library, "x")).toThrowError(expect.objectContaining({ code: "unknown-composition" }));
  });
});
