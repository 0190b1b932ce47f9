import { expect, it } from "vitest";
import { CentralBall } from "../../src/interior/centralBall.ts";
import { CONTROLLED, STATE_SIZE, StructureEquations } from "../../src/interior/structureEquations.ts";
import { AdaptiveIntegrator } from "../../src/numerics/adaptiveIntegrator.ts";
import { GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { birchOf, vinetOf } from "../support/referenceMaterials.ts";

const ball = new CentralBall();

it.each([
  ["a soft ice", birchOf(1460, 23.7, 4.15), 50],
  ["iron in an Earth", vinetOf(8300, 156.2, 6.08), 360],
  ["iron in a giant", vinetOf(8300, 156.2, 6.08), 30000],
])("equals an integration that starts 1000 times deeper: %s", (_name, curve, pressureGPa) => {
  const pressure = pressureGPa * GPA;
  const edge = new Float64Array(STATE_SIZE);
  const s = ball.fill(curve, pressure, 0, Number.POSITIVE_INFINITY, edge);
  const integrator = new AdaptiveIntegrator(STATE_SIZE, CONTROLLED);
  integrator.tolerance = 1e-12;
  integrator.x = ball.fill(curve, pressure, 0, s / 1000, integrator.y);
  expectClose(integrator.x, s / 1000, { rel: 1e-15, because: "the ball ends where it is told to" });
  integrator.advance(new StructureEquations(curve).byMass, s);
  edge.forEach((value, slot) => {
    const rel = slot < CONTROLLED ? 3e-11 : 1e-7;
    expectClose(value, integrator.y[slot], { rel, because: "degree-8 collocation, steps at 1e-12" });
  });
  expect(curve.pressure(edge[1])).toBeGreaterThan(0.9 * pressure);
});
