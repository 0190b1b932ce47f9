import type { Source } from "../eos/material.ts";
import type { Composition } from "../library/composition.ts";
import { sourcesOf } from "../library/sources.ts";
import { constants, EARTH_MASS } from "../units/constants.ts";
import type { EarthRadius } from "./earthRadius.ts";
import { shellQuote } from "./shellQuote.ts";
import { escapeControls } from "./terminal.ts";
import { version } from "./version.ts";

/** What a reader needs to judge and repeat a result; stands at the head of every output. No dates: the same input gives the same bytes. */
export interface Provenance {
  readonly bulkwright: string;
  readonly command: string;
  readonly unit: readonly string[];
  readonly constant: readonly string[];
  readonly source: readonly string[];
  readonly note: readonly string[];
}

export function provenanceOf(run: {
  args: readonly string[];
  earthRadius: EarthRadius;
  compositions?: readonly Composition[];
  notes?: readonly string[];
}): Provenance {
  const { gravitational } = constants;
  return {
    bulkwright: version,
    command: reproducingCommand(run.args),
    unit: [
      `Earth radius ${run.earthRadius.value / 1e3} km (${run.earthRadius.source})`,
      `Earth mass ${EARTH_MASS.toPrecision(12)} kg = nominal GM / G (${constants.earthMassParameter.source})`,
    ],
    constant: [
      `G = ${gravitational.value} ± ${gravitational.uncertainty} ${gravitational.unit} (${gravitational.source})`,
    ],
    source: sourcesOf(run.compositions ?? []).map((source) => `${source.subject}: ${sourceText(source)}`),
    note: run.notes ?? [],
  };
}

/** Leading comment lines of a CSV file. */
export function provenanceLines(provenance: Provenance): string {
  const lines = Object.entries(provenance).flatMap(([key, value]) => [value].flat().map((text) => `${key}: ${text}`));
  return lines.map((line) => `# ${escapeControls(line, { keepLineBreaks: false })}\n`).join("");
}

/** The command line as a shell reads it back. */
export function reproducingCommand(args: readonly string[]): string {
  return ["bulkwright", ...args.map(shellQuote)].join(" ");
}

export function sourceText({ citation, doi, note }: Source): string {
  return [citation, doi && `doi:${doi}`, note].filter(Boolean).join("; ");
}
