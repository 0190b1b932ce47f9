import { describe, expect, test } from "vitest";
import { bridge } from "../../src/eos/bridge.ts";
import { constantDensity } from "../../src/eos/constantDensity.ts";
import type { EosCurve } from "../../src/eos/curve.ts";
import { expectClose } from "../support/expectClose.ts";
import { densityAtGPa, GPA, ironPolytrope, ironSmith, ironTfd, ironVinet, slopesAt } from "./forms.ts";

/** d ln ρ/d ln P */
function logSlope(curve: EosCurve, gpa: number): number {
  const [slope, , density] = slopesAt(curve, curve.coordinate(gpa * GPA));
  return (gpa * GPA * density) / slope;
}

describe("bridge", () => {
  const curve = bridge(ironSmith, ironTfd, 1374 * GPA, 11000 * GPA);

  test("has the density and the slope of its neighbours at its ends", () => {
    const because = "closed form: rounding";
    expectClose(densityAtGPa(curve, 1374), densityAtGPa(ironSmith, 1374), { rel: 1e-14, because });
    expectClose(densityAtGPa(curve, 11000), densityAtGPa(ironTfd, 11000), { rel: 1e-14, because });
    expectClose(logSlope(curve, 1374), logSlope(ironSmith, 1374), { rel: 1e-12, because });
    expectClose(logSlope(curve, 11000), logSlope(ironTfd, 11000), { rel: 1e-12, because });
  });

  test("rises throughout", () => {
    for (let gpa = 1374; gpa <= 11000; gpa += 26) expect(logSlope(curve, gpa)).toBeGreaterThan(0);
  });

  test("between two ends of one power law is that power law", () => {
    const soft = bridge(ironPolytrope, ironPolytrope, 1e8 * GPA, 1.01e8 * GPA);
    const because = "ρ0 is 1e-4 of the density there, so that the polytrope is a power to about 1e-8 over a percent";
    expectClose(densityAtGPa(soft, 1.005e8), densityAtGPa(ironPolytrope, 1.005e8), { rel: 1e-9, because });
  });

  test("is refused where density would have to fall or the cubic would overshoot", () => {
    const steep = [
      () => bridge(ironVinet, constantDensity({ density: 9000 }), 330 * GPA, 1000 * GPA),
      () => bridge(ironSmith, ironTfd, 1374 * GPA, 1500 * GPA),
      () => bridge(ironSmith, ironTfd, 1374 * GPA, 2200 * GPA),
      () => bridge(ironSmith, ironTfd, 1374 * GPA, 1374 * GPA),
    ];
    for (const build of steep) {
      expect(build).toThrowError(expect.objectContaining({ code: "bridge-not-monotone" }));
    }
  });
});
