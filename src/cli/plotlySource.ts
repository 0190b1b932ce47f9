import { readFile } from "node:fs/promises";
import { createRequire } from "node:module";

/** Plotly is found by the package's own name, from the sources as from the built command. */
export function plotlySource(): Promise<string> {
  return readFile(createRequire(import.meta.url).resolve("bulkwright/plotly.min.js"), "utf8");
}
