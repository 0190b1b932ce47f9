// Writes dist/plotly.min.js, which every page with a diagram carries. ASCII, so that no page needs to know its encoding.
import { mkdir, readFile, writeFile } from "node:fs/promises";
import { createRequire } from "node:module";
import { dirname } from "node:path";
import { transform } from "esbuild";

const source = await readFile(createRequire(import.meta.url).resolve("plotly.js-dist"), "utf8");
// esbuild keeps comments marked as legal; Plotly's own licence, at the top, is not marked.
const banner = source.slice(0, source.indexOf("*/") + 2);
const { code } = await transform(source, { minify: true, legalComments: "inline", charset: "ascii" });

const target = process.argv[2] ?? "dist/plotly.min.js";
await mkdir(dirname(target), { recursive: true });
await writeFile(target, `${banner}\n${code}`);
