import { expect, test } from "vitest";
import * as melting from "../../../src/eos/water/meltingCurves.ts";

// IAPWS R14-08(2011), check values of the release and, for the last three, of published tables of it; sublimation from memory.
test.each([
  [melting.meltingPressureIh, 260, "138.268113", 1e6],
  [melting.meltingPressureIII, 254, "268.684647", 1e6],
  [melting.meltingPressureV, 265, "479.640244", 1e6],
  [melting.meltingPressureVI, 320, "1356.75652", 1e6],
  [melting.meltingPressureVII, 550, "6308.71424", 1e6],
  [melting.sublimationPressure, 230, "8.94735", 1],
  [melting.meltingPressureVI, 300, "996.109507", 1e6],
  [melting.meltingPressureVII, 400, "2816.64259", 1e6],
  [melting.meltingPressureVII, 715, "20617.8128", 1e6],
] as const)("%o at %s K is %s", (curve, temperature, expected, unit) => {
  expect((curve(temperature) / unit).toPrecision(expected.length - 1)).toBe(expected);
});
