import { describe, expect, it } from "vitest";
import { debyeFunction, debyeState } from "../../../src/eos/thermal/debye.ts";
import reference from "../../fixtures/thermal/thermal-reference.json" with { type: "json" };
import { expectClose } from "../../support/expectClose.ts";

describe("debyeFunction", () => {
  it.each(reference.debye)("agrees with quadrature at 40 digits at t = %d", (t, energy, heatCapacity, entropy) => {
    const tolerance = { rel: 2e-14, because: "both series end at rounding" };
    const state = debyeState(t);
    expectClose(state.energy, energy, tolerance);
    expectClose(state.heatCapacity, heatCapacity, { rel: 1e-13, because: "a difference of two like terms" });
    expectClose(state.entropy, entropy, tolerance);
  });

  it("has the classical and the cold limit", () => {
    expect(debyeFunction(0)).toBe(1);
    expect(debyeState(0).heatCapacity).toBe(1);
    expect(debyeFunction(Number.POSITIVE_INFINITY)).toBe(0);
    expect(debyeState(Number.POSITIVE_INFINITY)).toEqual({ energy: 0, heatCapacity: 0, entropy: 0 });
    // Debye's T³ law: c_V/3R = (4π⁴/5) (T/θ)³.
    expectClose(debyeState(200).heatCapacity, ((4 * Math.PI ** 4) / 5) * 200 ** -3, { rel: 1e-14, because: "exact" });
  });

  it.each([-1, Number.NaN])("refuses the argument %d", (t) => {
    expect(() => debyeFunction(t)).toThrow(expect.objectContaining({ code: "debye-argument" }));
  });
});
