import { InvalidArgumentError } from "commander";
import { type Constant, constants } from "../units/constants.ts";

/** The unit of radii, read and written. `value` in m. */
export type EarthRadius = Pick<Constant, "value" | "source">;

/** Parses `--earth-radius-km`. The range holds every radius in use for the Earth and catches a slip of unit. */
export function parseEarthRadius(text: string): EarthRadius {
  if (text === "mean") return constants.earthMeanRadius;
  const metres = Math.round(Number(text) * 1e6) / 1e3;
  for (const known of [constants.earthRadius, constants.earthMeanRadius]) if (metres === known.value) return known;
  if (!(metres >= 6.3e6 && metres <= 6.4e6)) {
    throw new InvalidArgumentError("Give a length from 6300 to 6400 in km, or `mean` for 6371.0.");
  }
  return { value: metres, source: "given by the user" };
}
