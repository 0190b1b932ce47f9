import { expect, test } from "vitest";
import { EquidistantNodes, quinticWeights } from "../../src/numerics/equidistantNodes.ts";
import { expectClose } from "../support/expectClose.ts";

const nodesOf = (f: (x: number) => number, count: number, from: number, step: number) =>
  new EquidistantNodes(
    from,
    step,
    Float64Array.from({ length: count }, (_, i) => f(from + i * step)),
  );

test("quintics are reproduced, at the ends too", () => {
  const quintic = (x: number) => 3 + x * (1 - x * (0.5 - x * (0.25 + x * (0.1 - 0.05 * x))));
  const nodes = nodesOf(quintic, 9, -1, 0.5);
  for (const x of [-1, -0.93, 0.1, 1.77, 2.99, 3]) {
    expectClose(nodes.value(x), quintic(x), { rel: 1e-13, because: "round-off" });
  }
});

test("the error falls with the sixth power of the spacing", () => {
  // Halfway between nodes, away from the ends, where the nodes lie on one side.
  const errors = [16, 32, 64].map((count) => {
    const step = 6 / count;
    const nodes = nodesOf(Math.sin, count + 1, 0, step);
    const middles = Array.from({ length: count - 6 }, (_, i) => (i + 3.5) * step);
    return Math.max(...middles.map((x) => Math.abs(nodes.value(x) - Math.sin(x))));
  });
  expect(Math.abs(Math.log2(errors[0] / errors[1]) - 6)).toBeLessThan(0.2);
  expect(Math.abs(Math.log2(errors[1] / errors[2]) - 6)).toBeLessThan(0.2);
});

test("weights sum to 1 and are those of a node at the node", () => {
  const weights = new Float64Array(6);
  quinticWeights(2.3, weights);
  expectClose(
    weights.reduce((sum, w) => sum + w),
    1,
    { rel: 1e-14, because: "round-off" },
  );
  quinticWeights(4, weights);
  expect(Array.from(weights, (w) => w + 0)).toEqual([0, 0, 0, 0, 1, 0]);
});
