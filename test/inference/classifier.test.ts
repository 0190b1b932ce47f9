import { describe, expect, test } from "vitest";
import { InputError } from "../../src/errors.ts";
import { type ClassifierModels, classifier } from "../../src/inference/classifier.ts";
import { reference } from "../fixtures/inference/reference.ts";
import { expectClose } from "../support/expectClose.ts";
import { thrownBy } from "../support/thrownBy.ts";
import { quantity, rowWith } from "./planetRows.ts";
import { boundaries, family, powerLaw, range } from "./powerLaws.ts";

const [iron, silicate, water] = boundaries;
const models: ClassifierModels = {
  labels: ["iron", "silicate", "water"],
  iron,
  silicate,
  water,
  ironSilicate: family,
  waterOnEarthLike: { ...range, member: (f) => powerLaw(1 + 0.4 * f) },
};
const { classify } = classifier(models);
const measured = (value: number, minus: number, plus = minus) => quantity(value, { minus, plus });

describe("classify", () => {
  test.each(reference.cases)(
    "mass $mass, radius $radius: the reference, as one result",
    ({ mass, radius, ...expected }) => {
      const result = classify(rowWith({ mass: measured(...mass), radius: measured(...radius) }));
      if (!result.verdict) throw new Error(`refused: ${result.reasons}`);
      const { pDenserThanIron, pIronSilicate, pSilicateWater, pLighterThanWater } = result;
      const probabilities = [pDenserThanIron, pIronSilicate, pSilicateWater, pLighterThanWater];
      probabilities.forEach((p, i) => {
        expect(Math.abs(p - expected.classes[i])).toBeLessThan(1e-8);
      });
      expectClose(
        probabilities.reduce((sum, p) => sum + p),
        1,
        { rel: 1e-12, because: "normalised" },
      );
      const { median, minus, plus } = result.coreMassFraction;
      const tolerance = { rel: 1e-5, because: "1e-6 of the percentiles, in their difference" };
      expectClose(median, expected.fraction[1], tolerance);
      expectClose(minus, expected.fraction[1] - expected.fraction[0], tolerance);
      expectClose(plus, expected.fraction[2] - expected.fraction[1], tolerance);
      expect(result.reasons).toBeUndefined();
    },
  );

  test("gives both readings to a planet between the Earth-like and the silicate curve", () => {
    const result = classify(rowWith({ mass: measured(1, 0.01), radius: measured(1.05, 0.005) }));
    expect(result.verdict?.code).toBe("iron-silicate");
    if (!result.verdict) return;
    expect(result.coreMassFraction.median).toBeCloseTo(0.05 / 0.3, 2);
    expect(result.waterMassFraction.median).toBeCloseTo(0.05 / 0.4, 2);
  });

  test("tells of a radius alone what mass the curves allow", () => {
    const result = classify(rowWith({ radius: quantity(1.2), mass: quantity(9, { kind: "from-relation" }) }));
    expect(result).toEqual({
      reasons: ["mass-from-relation", "radius-error-missing"],
      massIfSilicate: silicate.massWithRadius(1.2),
      massIfIron: iron.massWithRadius(1.2),
    });
  });

  test("tells of a mass alone what radius the curves allow, as far as they reach", () => {
    expect(classify(rowWith({ mass: quantity(3) }))).toEqual({
      reasons: ["mass-error-missing", "radius-missing"],
      radiusIfSilicate: silicate.radius(3),
      radiusIfIron: iron.radius(3),
      radiusIfWater: water.radius(3),
    });
    expect(classify(rowWith({ mass: quantity(3000) }))).toEqual({ reasons: ["mass-error-missing", "radius-missing"] });
  });

  test("says nothing of a minimum mass: the true one is unknown", () => {
    const result = classify(rowWith({ minimumMass: quantity(3, { kind: "minimum", minus: 1, plus: 1 }) }));
    expect(result).toEqual({ reasons: ["mass-minimum", "radius-missing"] });
  });

  test("refuses masses the models do not reach, but not a small planet for its large error", () => {
    const radius = measured(1, 0.1);
    for (const mass of [measured(0.0005, 0.0001), measured(2000, 10), measured(900, 100)]) {
      expect(classify(rowWith({ mass, radius }))).toEqual({ reasons: ["mass-beyond-models"] });
    }
    expect(classify(rowWith({ mass: measured(700, 100), radius })).verdict).toBeDefined();
    expect(classify(rowWith({ mass: measured(0.1, 0.08), radius })).verdict).toBeDefined();
  });

  test("does not depend on what was classified before", () => {
    const row = rowWith({ mass: measured(2, 0.3), radius: measured(1.2, 0.05) });
    const first = JSON.stringify(classify(row));
    classify(rowWith({ mass: measured(20, 3), radius: measured(2.2, 0.05) }));
    expect(JSON.stringify(classify(row))).toBe(first);
  });
});

test("classifier refuses boundaries that cross or come in the wrong order", () => {
  for (const wrong of [{ iron: silicate, silicate: iron }, { silicate: powerLaw(1, 0.35) }]) {
    const error = thrownBy(() => classifier({ ...models, ...wrong }));
    expect(error).toBeInstanceOf(InputError);
    expect(error).toMatchObject({ code: "boundaries-cross" });
  }
});

test("classifier keeps to the masses that all its models have", () => {
  const short = classifier({
    ...models,
    silicate: { ...silicate, heaviest: 40 },
    ironSilicate: { ...family, lightest: 0.1 },
  });
  expect(short.range).toEqual({ lightest: 0.1, heaviest: 40 });
});
