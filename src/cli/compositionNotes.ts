import { TRANSIT_PRESSURE } from "../envelope/transit.ts";
import type { Composition } from "../library/composition.ts";

/** What a reader of a table must know of a composition: where its temperature comes from, what the radius means. */
export function compositionNotes(composition: Composition): string[] {
  return [temperatureNote(composition), ...envelopeNotes(composition)];
}

export function temperatureNote({ name, temperature, layers }: Composition): string {
  if (temperature === undefined) return `${name} is cold: its equations of state hold at the temperature of their data`;
  const heated = layers.flatMap((layer) => {
    if (layer.heating === undefined) return [];
    return "top" in layer.heating
      ? [`${layer.name} begins at ${layer.heating.top} K`]
      : [`${layer.name} begins ${layer.heating.jump} K hotter than the layer above ends`];
  });
  const unmoved = layers.flatMap((layer) => (layer.material.warmed ? [] : [`${layer.name} knows no temperature`]));
  return [`temperature of ${name}: ${modeText(temperature)}`, ...heated, ...unmoved].join("; ");
}

function modeText({ mode, top }: NonNullable<Composition["temperature"]>): string {
  switch (mode.kind) {
    case "isothermal":
      return `isothermal at ${top} K`;
    case "adiabatic":
      return `adiabatic from ${top} K at the surface`;
    case "table":
      return `a table by pressure, from ${top} K at the surface`;
  }
}

function envelopeNotes({ name, envelope }: Composition): string[] {
  if (envelope === undefined) return [];
  return [
    `the radius of ${name} (radius_earth) is that of a transit, at ${TRANSIT_PRESSURE} Pa, with the radiative ` +
      "atmosphere; the convective one (radius_earth_convective) ends below that. As readings of one measured radius " +
      "they give envelope masses up to a factor of 2 apart",
    `what lies under the gas of ${name} is solved without its weight; the error of the scaling is in no error given here`,
  ];
}
