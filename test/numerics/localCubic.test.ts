import { describe, expect, test } from "vitest";
import { LocalCubic } from "../../src/numerics/localCubic.ts";
import { expectClose } from "../support/expectClose.ts";

describe("LocalCubic", () => {
  test("reproduces a cubic on uneven nodes, to both ends", () => {
    const cubic = (x: number) => 2 - x + 0.5 * x ** 2 - 0.3 * x ** 3;
    const x = [0, 0.1, 0.5, 0.6, 1.5, 2.5, 2.6];
    const curve = new LocalCubic(x, x.map(cubic));
    for (let t = 0; t <= 2.6; t += 0.01) {
      expect(Math.abs(curve.value(t) - cubic(t))).toBeLessThan(1e-13);
    }
  });

  test("converges with the fourth power of the node distance", () => {
    const errors = [20, 40, 80].map((n) => {
      const x = Array.from({ length: n + 1 }, (_, i) => (3 * i) / n);
      const curve = new LocalCubic(x, x.map(Math.sin));
      return Math.max(
        ...Array.from({ length: 997 }, (_, i) => (3 * i) / 997).map((t) => Math.abs(curve.value(t) - Math.sin(t))),
      );
    });
    const orders = [Math.log2(errors[0] / errors[1]), Math.log2(errors[1] / errors[2])];
    for (const order of orders) expect(Math.abs(order - 4)).toBeLessThan(0.2);
  });

  test("uses the nearest nodes: between 0 and 1 it misses x⁴ by (x + 1) x (x - 1) (x - 2)", () => {
    const x = [-3, -2, -1, 0, 1, 2, 3, 4];
    const curve = new LocalCubic(
      x,
      x.map((t) => t ** 4),
    );
    expectClose(0.5 ** 4 - curve.value(0.5), 0.5625, { rel: 1e-12, because: "the exact remainder" });
  });

  test("passes through its nodes", () => {
    const curve = new LocalCubic([1, 2, 4, 8, 9], [3, -1, 5, 2, 7]);
    expect([1, 2, 4, 8, 9].map((x) => curve.value(x))).toEqual([3, -1, 5, 2, 7]);
    expectClose(curve.value(9), 7, { rel: 1e-15, because: "a node" });
  });
});
