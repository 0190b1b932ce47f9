import { ModelRangeError } from "../../errors.ts";
import type { Source } from "../material.ts";
import { type FluidBranch, fluidDensity, fluidLimits } from "./fluidDensity.ts";
import { fluidState } from "./fluidState.ts";
import { iceIhState } from "./iceIh.ts";
import { iceIIIState, iceIIState, iceVState } from "./icesToV.ts";
import { iceVIState } from "./iceVI.ts";
import { iceVIIState } from "./iceVII.ts";
import type { WaterPhaseName } from "./phaseBoundaries.ts";
import { waterPhase } from "./phaseDiagram.ts";
import type { WaterState } from "./waterState.ts";

/** One phase of water: its state at a pressure [Pa] and temperature [K], how far data reach [Pa], and whose they are. */
export interface WaterPhaseModel {
  state(pressure: number, temperature: number): WaterState;
  readonly calibratedTo: number;
  readonly source: Source;
}

const fluid = (branch: FluidBranch): WaterPhaseModel => ({
  state: (pressure, temperature) => fluidState(fluidDensity(pressure, temperature, branch), temperature),
  calibratedTo: fluidLimits.calibratedPressure,
  source: {
    citation: "IAPWS R6-95(2018); Wagner & Pruss 2002, J. Phys. Chem. Ref. Data 31, 387",
    doi: "10.1063/1.1461829",
    note: "extrapolated above 1 GPa and 1273 K; against shock data density is 1 % off to 26 GPa, 6 % at 84 GPa",
  },
});

const dense = fluid("dense");
const grasset: Source = {
  citation: "Choukroun & Grasset 2010, J. Chem. Phys. 133, 144502",
  doi: "10.1063/1.3487520",
  note: "parameters at second hand, heat capacity from memory",
};
const calibration = { calibratedTo: 2.2e9, source: grasset };

export const waterPhases: Readonly<Record<WaterPhaseName, WaterPhaseModel>> = {
  vapour: fluid("vapour"),
  liquid: dense,
  supercritical: dense,
  "ice-Ih": {
    state: iceIhState,
    calibratedTo: 208.566e6,
    source: {
      citation: "IAPWS R10-06(2009); Feistel & Wagner 2006, J. Phys. Chem. Ref. Data 35, 1021",
      doi: "10.1063/1.2183324",
    },
  },
  "ice-II": { state: iceIIState, ...calibration },
  "ice-III": { state: iceIIIState, ...calibration },
  "ice-V": { state: iceVState, ...calibration },
  "ice-VI": {
    state: iceVIState,
    calibratedTo: 2.3e9,
    source: {
      citation: "Bezacier et al. 2014, J. Chem. Phys. 141, 104505; temperature after Choukroun & Grasset 2010",
      doi: "10.1063/1.4894421",
      note: "parameters from memory; density to about 1 %",
    },
  },
  "ice-VII": {
    state: iceVIIState,
    calibratedTo: 128e9,
    source: {
      citation:
        "Hemley et al. 1987, Nature 330, 737; expansivity of Frank, Fei & Hu 2004, Geochim. Cosmochim. Acta 68, 2781",
      doi: "10.1038/330737a0",
      note: "expansivity from memory; one curve for ices VII, VIII and X, the change to X near 60 GPa is gradual",
    },
  },
};

export function isFluid(name: WaterPhaseName): boolean {
  return name === "vapour" || name === "liquid" || name === "supercritical";
}

/**
 * The stable phase of water at a pressure [Pa] and temperature [K], and its state.
 * Throws  as `waterPhase`; ModelRangeError `water-fluid-range` for fluid at 100 GPa or more, where no form here holds
 */
export function stableWater(pressure: number, temperature: number): WaterState & { readonly phase: WaterPhaseName } {
  const phase = waterPhase(pressure, temperature);
  if (isFluid(phase) && pressure >= fluidLimits.maxPressure) {
    throw new ModelRangeError(
      "water-fluid-range",
      `Water at ${pressure} Pa and ${temperature} K is fluid, and IAPWS-95 is extrapolated to ${fluidLimits.maxPressure} Pa ` +
        "at most; take a lower pressure or temperature.",
      { quantity: "pressure", value: pressure, maximum: fluidLimits.maxPressure },
    );
  }
  return { phase, ...waterPhases[phase].state(pressure, temperature) };
}
