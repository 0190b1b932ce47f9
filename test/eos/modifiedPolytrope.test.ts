import { describe, expect, test } from "vitest";
import { modifiedPolytrope } from "../../src/eos/modifiedPolytrope.ts";
import { expectClose } from "../support/expectClose.ts";
import { classicalPolytrope, ironPolytrope, slopesAt } from "./forms.ts";

const rounding = { rel: 1e-14, because: "a few roundings, one of them in a power" };

describe("modified polytrope", () => {
  test("is ρ0 + c P^n", () => {
    for (const pressure of [1e6, 1e11, 3.64e11, 1e16]) {
      const expected = 8300 + 0.00349 * pressure ** 0.528;
      expectClose(ironPolytrope.density(ironPolytrope.coordinate(pressure)), expected, rounding);
    }
  });

  test("of iron at 364 GPa has 12.74 g/cm3 (computed independently from Seager et al. 2007, table 3)", () => {
    const density = ironPolytrope.density(ironPolytrope.coordinate(364e9));
    expectClose(density, 12740, { rel: 5e-4, because: "given to four digits" });
  });

  test("at zero pressure every slope has its limit", () => {
    expect(ironPolytrope.coordinate(0)).toBe(0);
    const slopes = slopesAt(ironPolytrope, 0);
    // n = 0.528: P = y^2.12, so that dP/dy, its ratio to ρ0 and d ln ρ/dy = d(c y^1.12)/dy / ρ0 vanish.
    expect([...slopes]).toEqual([0, 0, 0, Number.POSITIVE_INFINITY]);
    const soft = modifiedPolytrope({ densityZero: 1000, coefficient: 1, exponent: 0.4 });
    expect(slopesAt(soft, 0)[2]).toBe(Number.POSITIVE_INFINITY);
    const linear = modifiedPolytrope({ densityZero: 1000, coefficient: 1, exponent: 0.5 });
    expectClose(slopesAt(linear, 0)[2], 1 / 1000, rounding);
  });

  test("with ρ0 = 0 the slope of enthalpy is the same everywhere, the surface included", () => {
    const expected = 1 / 0.4 / 0.00349;
    for (const pressure of [0, 1, 1e5, 1e12]) {
      expectClose(slopesAt(classicalPolytrope, classicalPolytrope.coordinate(pressure))[1], expected, rounding);
    }
    expect(classicalPolytrope.density(0)).toBe(0);
  });

  test.each([
    ["densityZero", { densityZero: -1 }],
    ["coefficient", { coefficient: 0 }],
    ["exponent", { exponent: 1 }],
    ["exponent", { exponent: Number.NaN }],
  ])("an impossible %s is named", (name, wrong) => {
    const make = () => modifiedPolytrope({ densityZero: 1000, coefficient: 1, exponent: 0.5, ...wrong });
    expect(make).toThrowError(expect.objectContaining({ code: "eos-parameter", place: { column: name } }));
  });
});
