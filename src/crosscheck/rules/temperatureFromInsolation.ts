import { constants } from "../../units/constants.ts";
import { relationRule } from "../relationRule.ts";
import { temperatureRange } from "../temperatureRange.ts";

/** Needs no star: both columns describe the planet. Assumptions about albedo and redistribution: temperatureRange.ts. */
export const temperatureFromInsolation = relationRule(
  {
    quantity: "equilibriumTemperature",
    factor: (4 * constants.stefanBoltzmann.value) ** -0.25,
    powers: { insolation: 0.25 },
    allowed: () => temperatureRange,
  },
  {
    id: "temperature-insolation",
    claim: "The equilibrium temperature is one the stated insolation can cause",
    formula: "T = [f(1 − A) S / 4σ]^¼, Bond albedo A from 0 to 0.8, redistribution f from 1 to 8/3",
    source: "Stefan–Boltzmann law; range of f from Cowan & Agol 2011, ApJ 729, 54 (from memory)",
    otherwise: "the temperature may be a measured one, or the insolation of another publication",
    remedy: "compute the temperature from the insolation, and state albedo and redistribution",
  },
);
