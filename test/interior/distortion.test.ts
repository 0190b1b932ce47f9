import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { synchronousFigure } from "../../src/interior/distortion.ts";
import { EARTH_MASS, EARTH_RADIUS, G } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";

interface Ellipsoid {
  readonly q: number;
  readonly axes: readonly [number, number, number];
}

/** Exact figures of uniform bodies, whose k2 is 3/2: see the README of the fixtures. */
const ellipsoids: readonly Ellipsoid[] = JSON.parse(
  readFileSync("test/fixtures/interior/roche-ellipsoids.json", "utf8"),
);
const earth = { mass: EARTH_MASS, radius: EARTH_RADIUS };

/** Figure of a uniform body at this strength of tide, in units of its volumetric radius. */
function figure(q: number) {
  const period = 2 * Math.PI * Math.sqrt(EARTH_RADIUS ** 3 / (G * EARTH_MASS * q));
  const { substellar, orbital, polar, transitRadius } = synchronousFigure(earth, 1.5, period);
  return [substellar, orbital, polar, transitRadius].map((axis) => axis / EARTH_RADIUS);
}

const exact = ({ axes: [substellar, orbital, polar] }: Ellipsoid) => [
  substellar,
  orbital,
  polar,
  Math.sqrt(orbital * polar),
];

describe("synchronousFigure", () => {
  it.each(ellipsoids)("agrees with the Roche ellipsoid of q = $q to the second order", (ellipsoid) => {
    const [substellar, orbital, polar, transitRadius] = figure(ellipsoid.q).map(
      (axis, i) => Math.abs(axis / exact(ellipsoid)[i] - 1) / (2.5 * ellipsoid.q) ** 2,
    );
    expect(substellar).toBeLessThan(4);
    for (const axis of [orbital, polar, transitRadius]) expect(axis).toBeLessThan(2);
  });

  it("errs by the square of the distortion, in every axis", () => {
    const errors = ellipsoids.slice(0, 2).map((e) => figure(e.q).map((axis, i) => Math.abs(axis - exact(e)[i])));
    for (const [i, error] of errors[0].entries()) {
      const order = Math.log2(errors[1][i] / error);
      expect(Math.abs(order - 2)).toBeLessThan(0.2);
    }
  });

  it("keeps the volume to first order, and the sphere without a tide", () => {
    const [a, b, c] = figure(1e-6);
    expectClose(a * b * c, 1, { rel: 1e-11, because: "second order in 2.5e-6" });
    for (const axis of figure(1e-18)) expectClose(axis, 1, { rel: 1e-15, because: "no tide" });
  });

  it.each([1e-9, 3 * 3600, Number.NaN])(
    "refuses a period of %d s, where the figure is not of first order",
    (period) => {
      expect(() => synchronousFigure(earth, 0.9, period)).toThrow(
        expect.objectContaining({ code: "distortion-range" }),
      );
    },
  );
});
