import { describe, expect, test } from "vitest";
import { mixCurves } from "../../src/eos/mixCurves.ts";
import { expectClose } from "../support/expectClose.ts";
import { densityAtGPa, GPA, ironPolytrope, ironTfd, ironVinet, perovskite, slopesAt } from "./forms.ts";

const rounding = { rel: 1e-14, because: "rounding" };

describe("mixture of curves", () => {
  const mixture = mixCurves([
    { curve: ironVinet, massFraction: 0.325 },
    { curve: perovskite, massFraction: 0.675 },
  ]);

  test("adds volumes at equal pressure", () => {
    for (const gpa of [0, 1, 136, 2000]) {
      const volume = 0.325 / densityAtGPa(ironVinet, gpa) + 0.675 / densityAtGPa(perovskite, gpa);
      expectClose(densityAtGPa(mixture, gpa), 1 / volume, rounding);
    }
  });

  test("does not depend on the order of its parts", () => {
    const reversed = mixCurves([
      { curve: perovskite, massFraction: 0.675 },
      { curve: ironVinet, massFraction: 0.325 },
    ]);
    for (const gpa of [1, 136, 2000]) {
      expectClose(densityAtGPa(reversed, gpa), densityAtGPa(mixture, gpa), { rel: 1e-13, because: "inversion" });
    }
  });

  test("of one substance with itself is that substance, slopes included", () => {
    const same = mixCurves([
      { curve: perovskite, massFraction: 0.4 },
      { curve: perovskite, massFraction: 0.6 },
    ]);
    const y = perovskite.coordinate(100 * GPA);
    slopesAt(perovskite, y).forEach((slope, i) => {
      expectClose(slopesAt(same, y)[i], slope, { rel: 1e-12, because: "inversion" });
    });
  });

  test("of one part is that part", () => {
    expect(mixCurves([{ curve: perovskite, massFraction: 1 }])).toBe(perovskite);
  });

  test("holds where all its parts do", () => {
    expect(mixture.maxPressure).toBe(perovskite.maxPressure);
    const withTfd = mixCurves([
      { curve: ironPolytrope, massFraction: 0.5 },
      { curve: ironTfd, massFraction: 0.5 },
    ]);
    expect(withTfd.minPressure).toBe(ironTfd.minPressure);
    expect(() => withTfd.coordinate(0)).toThrowError(expect.objectContaining({ code: "eos-pressure-range" }));
  });

  test("of polytropes has finite dP/dy and enthalpy slope at zero pressure", () => {
    const polytropes = mixCurves([
      { curve: ironPolytrope, massFraction: 0.5 },
      { curve: ironPolytrope, massFraction: 0.5 },
    ]);
    expect([...slopesAt(polytropes, 0)]).toEqual([0, 0, Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY]);
  });
});
