// Speed as ratios within one run: absolute times mean nothing on a shared machine, so each measurement stands beside a
// baseline taken in the same minute. Prints a table and writes output/bench.json. Needs `npm run build` first.
import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { cpus, tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { listReading } from "./listReading.mjs";

const root = fileURLToPath(new URL("../../", import.meta.url));
const cli = join(root, "dist/cli/main.js");
const scratch = mkdtempSync(join(tmpdir(), "bulkwright-bench-"));
const PLANETS = 20_000;
const ROUNDS = 5;

const seconds = (command, args) => {
  const start = process.hrtime.bigint();
  const { status, stderr } = spawnSync(command, args, { cwd: root, maxBuffer: 2 ** 30 });
  if (status !== 0) throw new Error(`${command} ${args.join(" ")} failed:\n${stderr}`);
  return Number(process.hrtime.bigint() - start) / 1e9;
};
const median = (values) => values.toSorted((a, b) => a - b)[values.length >> 1];
const node = (...args) => seconds(process.execPath, args);

const results = [];
const report = (what, value, unit, limit) => {
  results.push({ what, value, unit, limit });
  console.log(`${what.padEnd(66)} ${value.toPrecision(4).padStart(9)} ${unit}${limit ? `   (${limit})` : ""}`);
};

/** The same planets in C (DOP853, secant shooting), or undefined without a compiler. */
function compileBaseline() {
  const binary = join(scratch, "two_layer");
  const source = join(root, "test/bench/baseline/two_layer.c");
  const { status } = spawnSync("gcc", ["-O3", "-march=native", "-ffast-math", "-o", binary, source, "-lm"]);
  return status === 0 ? binary : undefined;
}

function curveAgainstC() {
  const sweep = ["curve", "two-layer-birch", "--library", join(root, "test/bench/library")];
  const file = join(scratch, "curve.csv");
  const masses = ["--masses", `0.1:10:${PLANETS}`, "--quiet", "--out", file];
  const baseline = compileBaseline();
  const ours = [];
  const theirs = [];
  for (let round = 0; round < ROUNDS; round++) {
    ours.push(node(cli, ...sweep, ...masses));
    if (baseline) theirs.push(seconds(baseline, [String(PLANETS), "1e-8"]));
  }
  report("curve: planets a second, start-up and CSV included", PLANETS / median(ours), "1/s");
  if (baseline) report("curve: time against C at its 1e-8 setting", median(ours) / median(theirs), "×", "at most 1.5");
  else console.log("curve: no ratio to C, as no gcc was found");
}

function workPerPlanet({ loadLibrary, shippedFiles, sweepMasses, EARTH_MASS }) {
  const masses = Array.from({ length: PLANETS }, (_, i) => 0.1 * 100 ** (i / (PLANETS - 1)) * EARTH_MASS);
  const earthLike = loadLibrary(shippedFiles).composition("earth-like");
  const counters = (list) => {
    const planets = [...sweepMasses(earthLike, list)].map(({ planet }) => planet);
    return planets.reduce((sum, planet) => sum + planet.counters.rightHandSides, 0) / planets.length;
  };
  report("earth-like: right-hand sides a planet, dense sweep", counters(masses), "");
  report("earth-like: right-hand sides a planet, 60 masses", counters(masses.filter((_, i) => i % 339 === 0)), "");
}

function startUp() {
  const pairs = Array.from({ length: 10 }, () => [node(cli, "--help"), node("-e", "0")]);
  const [ours, bare] = [0, 1].map((i) => median(pairs.map((pair) => pair[i])));
  report("bulkwright --help: time against node -e 0", ours / bare, "×", "at most 1.6");
}

function classifyRate() {
  const rows = Array.from({ length: 1500 }, (_, i) => {
    const mass = 0.5 * 40 ** ((i * 0.618034) % 1);
    const radius = mass ** 0.27 * (0.8 + ((i * 0.754878) % 1));
    return `planet ${i},${mass.toFixed(3)},${(0.1 * mass).toFixed(3)},${(0.12 * mass).toFixed(3)},${radius.toFixed(3)},0.05,0.04`;
  });
  const header = "name,mass_earth,mass_earth_minus,mass_earth_plus,radius_earth,radius_earth_minus,radius_earth_plus";
  const list = join(scratch, "list.csv");
  writeFileSync(list, [header, ...rows, ""].join("\n"));
  const time = node(cli, "classify", list, "--quiet", "--out", join(scratch, "verdicts.csv"));
  report("classify: measured planets a second, start-up included", rows.length / time, "1/s");
}

try {
  curveAgainstC();
  const library = await import(join(root, "dist/index.js"));
  workPerPlanet(library);
  startUp();
  classifyRate();
  await listReading(report, library);
  const git = execFileSync("git", ["rev-parse", "HEAD"], { cwd: root, encoding: "utf8" }).trim();
  const machine = { cpu: cpus()[0].model, cores: cpus().length, node: process.version, commit: git };
  writeFileSync(join(root, "output/bench.json"), `${JSON.stringify({ machine, results }, null, 2)}\n`);
} finally {
  rmSync(scratch, { recursive: true });
}
