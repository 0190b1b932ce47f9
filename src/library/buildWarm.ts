import type { Material, Phase, RockMelting, Source, TemperatureMode } from "../eos/material.ts";
import { meltingCurves } from "../eos/melting/meltingCurves.ts";
import { meltingTemperature } from "../eos/melting/meltingTemperature.ts";
import { alongTemperature, isentrope, isotherm } from "../eos/thermal/temperaturePaths.ts";
import { type TemperaturePath, type WarmPhase, warmStack } from "../eos/thermal/warmStack.ts";
import { waterAdiabat, waterIsotherm } from "../eos/water/barotrope.ts";
import { InputError } from "../errors.ts";
import { ironCompounds } from "../mineralogy/ironCompounds.ts";
import { GPA } from "../units/constants.ts";
import { alloyed, buildThermalEos, freezingPressure } from "./buildThermal.ts";
import { buildCurve } from "./forms.ts";
import type { PhaseEntry } from "./schemas.ts";
import type { AlloyKeys } from "./thermalSchemas.ts";

/** Where a warm material is taken when nothing says how warm it is. */
const ROOM_TEMPERATURE = 300;

type Warmed = NonNullable<Material["warmed"]>;

/** A material whose phases depend on temperature; cold, it is at room temperature throughout. */
export function warmMaterial(
  what: Pick<Material, "name" | "title" | "source" | "melting">,
  warmPhases: readonly WarmPhase[],
): Material {
  const warmed: Warmed = (mode, pressure, temperature) => warmStack(warmPhases, pathOf(mode), pressure, temperature);
  return warmedMaterial({ ...what, everyPhase: warmPhases }, warmed, ROOM_TEMPERATURE);
}

/** Phases are made when first asked for; those of a top that stays where it is, as the outermost layer's, are kept. */
function warmedMaterial(what: Omit<Material, "phases" | "warmed">, make: Warmed, coldTemperature: number): Material {
  let last: { top: Parameters<Warmed>; phases: readonly Phase[] } | undefined;
  const warmed: Warmed = (...top) => {
    if (last === undefined || top.some((part, i) => part !== last?.top[i])) last = { top, phases: make(...top) };
    return last.phases;
  };
  let cold: readonly Phase[] | undefined;
  return {
    ...what,
    get phases() {
      cold ??= make({ kind: "isothermal" }, 0, coldTemperature);
      return cold;
    },
    warmed,
  };
}

const { silicateStixrude } = meltingCurves;

/** Melting of MgSiO3, which stands for a mantle's: rock of several minerals begins to melt some hundred kelvin below. */
export const rockMelting: RockMelting = {
  curve: silicateStixrude.name,
  fromPressure: silicateStixrude.branches[0].fromPressure,
  temperatureAt: (pressure) => meltingTemperature(silicateStixrude, pressure),
};

function pathOf(mode: TemperatureMode): TemperaturePath {
  switch (mode.kind) {
    case "isothermal":
      return (eos, pressure, temperature) => isotherm(eos, temperature, pressure);
    case "adiabatic":
      return isentrope;
    case "table":
      return (eos, pressure) =>
        alongTemperature(eos, mode.temperatureAt, { fromPressure: pressure, kinks: mode.kinks });
  }
}

/** A phase of a material file as part of a warm stack; it begins where the phase `before` it ends. */
export function warmPhase(phase: PhaseEntry, before: PhaseEntry | undefined): WarmPhase {
  const { phase: name, eos: keys, thermal, alloy, calibratedToGPa = 0, source } = phase;
  const curve = buildCurve(keys, noTable);
  if (curve === "bridge" || thermal === undefined) {
    throw new InputError("thermal-missing", `phase "${name}": a bridge has no temperature.`, { column: "eos" });
  }
  const eos = buildThermalEos(curve, keys, thermal);
  return {
    name,
    form: keys.form,
    eos: alloy === undefined ? eos : alloyed(eos, alloy),
    stableFrom: endOf(before),
    calibratedTo: calibratedToGPa * GPA,
    source: alloy === undefined ? source : withCarriers(source, alloy),
  };
}

/** A source that also names those of the compounds that hold the light elements. */
function withCarriers(source: Source, alloy: AlloyKeys): Source {
  const carriers = Object.entries(ironCompounds).filter(([element]) => element in alloy);
  const notes = carriers.map(
    ([element, { formula, source }]) => `${element} as ${formula}: ${source.citation}, ${source.note}`,
  );
  const note = [source.note, ...notes].filter(Boolean).join("; ");
  return note === "" ? source : { ...source, note };
}

/** The pressure [Pa] at which a phase gives way to the next, by temperature [K]. */
function endOf(phase: PhaseEntry | undefined): (temperature: number) => number {
  if (phase === undefined) return () => 0;
  if (phase.untilFreezing) return freezingPressure(phase.untilFreezing);
  const end = (phase.untilGPa ?? 0) * GPA;
  const { slopeMPaPerK = 0, atTemperatureK = 0 } = phase.clapeyron ?? {};
  return (temperature) => end + slopeMPaPerK * 1e6 * (temperature - atTemperatureK);
}

function noTable(): never {
  throw new InputError("thermal-table", "a table has no temperature: it cannot stand in a phase with `thermal`.");
}

/** Cold water without anything above it is ice: a surface at this temperature holds in vacuum [K]. */
const COLD_ICE = 250;

/** Water with its phases by pressure and temperature. */
export function waterMaterial(what: Pick<Material, "name" | "title" | "source">): Material {
  const warmed: Warmed = (mode, topPressure, topTemperature) => {
    switch (mode.kind) {
      case "isothermal":
        return waterIsotherm(topTemperature, topPressure);
      case "adiabatic":
        return waterAdiabat(topPressure, topTemperature);
      case "table":
        throw new InputError(
          "temperature-table",
          `${what.name}: water follows an isotherm or an adiabat, not a table of temperatures.`,
          { column: "temperature" },
        );
    }
  };
  return warmedMaterial(what, warmed, COLD_ICE);
}
