import { InputError } from "../errors.ts";
import { GPA } from "../units/constants.ts";
import type { Composition } from "./composition.ts";
import type { CompositionFile } from "./schemas.ts";

type Temperature = NonNullable<Composition["temperature"]>;

/**
 * The temperature of a composition file. Without one a planet is cold, unless a material exists only with temperature
 * (rock by its minerals, water): then all is as warm as the surface.
 * Throws InputError `temperature-table`; `temperature-unused` for the temperature of a layer that nothing would heed
 */
export function resolveTemperature(
  keys: CompositionFile["temperature"],
  layers: Composition["layers"],
  surfaceTemperature: number,
): Temperature | undefined {
  requireHeed(keys, layers);
  if (keys === undefined) {
    const warm = layers.some(({ material }) => material.warmed);
    return warm ? { mode: { kind: "isothermal" }, top: surfaceTemperature } : undefined;
  }
  switch (keys.mode) {
    case "isothermal":
      return { mode: { kind: "isothermal" }, top: keys.temperatureK };
    case "adiabatic":
      return { mode: { kind: "adiabatic" }, top: keys.potentialTemperatureK };
    case "table":
      return alongTable(
        keys.pressureGPa.map((pressure) => pressure * GPA),
        keys.temperatureK,
      );
  }
}

function requireHeed(keys: CompositionFile["temperature"], layers: Composition["layers"]): void {
  const heated = layers.findIndex(({ heating }) => heating !== undefined);
  if (heated === -1) return;
  const refuse = (reason: string): never => {
    throw new InputError(
      "temperature-unused",
      `layer ${heated + 1} from the centre, ${layers[heated].name}, has "temperatureJumpK" or "topTemperatureK", but ${reason}`,
      { column: "layers" },
    );
  };
  if (keys === undefined) refuse('the composition has no "temperature".');
  if (keys?.mode === "table") refuse("a table gives the temperature at every pressure.");
  if (layers[layers.length - 1].heating) refuse("the outermost layer begins at the temperature of the surface.");
}

/** Straight lines between the rows; constant beyond them. */
function alongTable(pressures: readonly number[], temperatures: readonly number[]): Temperature {
  const rising = pressures.every((pressure, i) => i === 0 || pressure > pressures[i - 1]);
  if (!rising || pressures.length !== temperatures.length) {
    throw new InputError(
      "temperature-table",
      `temperature: the table has ${pressures.length} pressures and ${temperatures.length} temperatures; ` +
        "give as many of each, pressures rising.",
      { column: "temperature" },
    );
  }
  const temperatureAt = (pressure: number): number => {
    const above = pressures.findIndex((row) => row >= pressure);
    if (above === -1) return temperatures[temperatures.length - 1];
    if (above === 0) return temperatures[0];
    const share = (pressure - pressures[above - 1]) / (pressures[above] - pressures[above - 1]);
    return temperatures[above - 1] + share * (temperatures[above] - temperatures[above - 1]);
  };
  return { mode: { kind: "table", temperatureAt, kinks: pressures.slice() }, top: temperatures[0] };
}
