import { describe, expect, test } from "vitest";
import { improvementSteps, presentProportion } from "../../../src/inference/precision/improvementSteps.ts";
import {
  errorSizes,
  isMeasured,
  presentMeasurement,
  withErrors,
} from "../../../src/inference/precision/plannedMeasurement.ts";
import { separation } from "../../../src/inference/precision/separation.ts";
import { thrownBy } from "../../support/thrownBy.ts";
import { measurement, powerLaw, quoted, range } from "../powerLaws.ts";

const contrast = { gap: 0.1, slope: 0.05 };
const on = (a: number) => ({ a: powerLaw(a), range });
const present = measurement(quoted(5, 1), quoted(1.6, 0.04));

describe("improvementSteps", () => {
  const steps = improvementSteps(present, contrast, [2, 3], 3);

  test("are today's errors, halved ones, and those that reach each level", () => {
    expect(steps.map(({ kind, improved, level }) => [kind, improved, level])).toEqual([
      ["now", undefined, undefined],
      ["halved", "mass", undefined],
      ["halved", "radius", undefined],
      ["halved", "both", undefined],
      ["required", "mass", 2],
      ["required", "radius", 2],
      ["required", "both", 2],
      ["required", "mass", 3],
      ["required", "radius", 3],
      ["required", "both", 3],
    ]);
    expect(steps.slice(0, 4).map(({ errors }) => errors)).toEqual([
      { mass: 1, radius: 0.04 },
      { mass: 0.5, radius: 0.04 },
      { mass: 1, radius: 0.02 },
      { mass: 0.5, radius: 0.02 },
    ]);
  });

  test("leave the other error alone, and say where one alone is not enough", () => {
    const at = (improved: string, level: number) =>
      steps.find((step) => step.improved === improved && step.level === level)?.errors;
    expect(at("mass", 2)?.radius).toBe(0.04);
    // The mass error alone takes the separation to 0.1 / 0.05 = 2 sigma, the radius error alone to 2.5.
    expect(at("radius", 2)).toBeUndefined();
    expect(at("mass", 3)).toBeUndefined();
    const both = at("both", 3);
    if (both === undefined) throw new Error("both together reach every level");
    expect(both.mass / 5 / (both.radius / 1.6)).toBeCloseTo(3, 12);
    expect(separation(contrast, both)).toBeCloseTo(3, 12);
  });

  test("halve only what is measured", () => {
    const radiusAlone = presentMeasurement({ radius: quoted(1.6, 0.04) }, on(1.1));
    const kinds = improvementSteps(radiusAlone, contrast, [2], 3).map(({ kind }) => kind);
    expect(kinds).toEqual(["now", "required", "required", "required"]);
  });

  test("keep today's proportion of the relative errors, 3 where one of them is missing", () => {
    expect(presentProportion(present)).toBeCloseTo(0.2 / 0.025, 12);
    expect(presentProportion(presentMeasurement({ mass: quoted(5, 1) }, on(1)))).toBe(3);
  });
});

describe("presentMeasurement", () => {
  test("takes what is missing from the curve, with no error to rely on", () => {
    const massAlone = presentMeasurement({ mass: quoted(5, 1) }, on(1.1));
    expect(massAlone.radius.mode).toBeCloseTo(1.1 * 5 ** 0.27, 12);
    expect(isMeasured(massAlone.radius)).toBe(false);
    const radiusAlone = presentMeasurement({ radius: quoted(1.6, 0.1) }, on(1.1));
    expect(radiusAlone.mass.mode).toBeCloseTo((1.6 / 1.1) ** (1 / 0.27), 12);
    expect(isMeasured(radiusAlone.mass)).toBe(false);
  });

  test("refuses what no planet of the curve has", () => {
    expect(thrownBy(() => presentMeasurement({}, on(1)))).toMatchObject({ code: "nothing-known" });
    expect(thrownBy(() => presentMeasurement({ mass: quoted(2e3, 1) }, on(1)))).toMatchObject({
      code: "mass-beyond-models",
    });
    const flat = { ...powerLaw(1), massWithRadius: () => undefined };
    expect(thrownBy(() => presentMeasurement({ radius: quoted(9, 1) }, { a: flat, range }))).toMatchObject({
      code: "radius-beyond-models",
    });
  });
});

describe("withErrors", () => {
  test("scales both sides alike", () => {
    const unequal = measurement(quoted(5, 1, 3), quoted(1.6, 0.1));
    expect(errorSizes(unequal)).toEqual({ mass: 2, radius: 0.1 });
    expect(withErrors(unequal, { mass: 1, radius: 0.1 }).mass).toEqual({ mode: 5, minus: 0.5, plus: 1.5 });
  });
});
