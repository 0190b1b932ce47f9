import { bytesOf } from "./inputFile.ts";
import type { ValueWithErrors } from "./numberOptions.ts";

export interface OnePlanet {
  readonly massEarth?: ValueWithErrors;
  readonly radiusEarth?: ValueWithErrors;
}

/** A planet given by options, as the list of one row it stands for, so that both go the same way. */
export function onePlanetList({ massEarth, radiusEarth }: OnePlanet): AsyncGenerator<Uint8Array> {
  const quantities = Object.entries({ mass_earth: massEarth, radius_earth: radiusEarth });
  const cells = quantities.flatMap(([name, given]) =>
    given
      ? [
          [name, given.value],
          [`${name}_minus`, given.minus],
          [`${name}_plus`, given.plus],
        ]
      : [],
  );
  const header = ["name", ...cells.map(([column]) => column)];
  const record = ["planet", ...cells.map(([, value]) => value)];
  return bytesOf(`${header.join(",")}\n${record.join(",")}\n`);
}
