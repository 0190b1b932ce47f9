import { mkdirSync, writeFileSync } from "node:fs";
import { within } from "./check.ts";
import { validationCsv, validationHtml } from "./report.ts";
import { validate } from "./validation.ts";

const run = validate();
mkdirSync("output", { recursive: true });
writeFileSync("output/validation.csv", validationCsv(run));
writeFileSync("output/validation.html", await validationHtml(run));
const counts = [true, false, undefined].map((state) => run.checks.filter((check) => within(check) === state).length);
console.log(
  `${counts[0]} bars met, ${counts[1]} missed, ${counts[2]} compared without a bar: output/validation.html, output/validation.csv`,
);
