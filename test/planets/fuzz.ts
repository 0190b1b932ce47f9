import fc from "fast-check";
import { properties } from "./properties.ts";

/** `npm run fuzz [-- RUNS [SEED]]`: every property of the readers many times, with the memory in use after each. */
export async function fuzz(runs: number, seed: number, print: (line: string) => void): Promise<boolean> {
  let isSound = true;
  for (const { name, property } of properties) {
    const { failed, numRuns, counterexample } = await fc.check(property, { numRuns: runs, seed });
    isSound &&= !failed;
    const megabytes = Math.round(process.memoryUsage().heapUsed / 1e6);
    print(`${failed ? "FAILED" : "passed"} ${numRuns} runs, ${megabytes} MB: ${name}`);
    if (failed) print(`  seed ${seed}: ${JSON.stringify(counterexample)}`);
  }
  return isSound;
}

const [runs = "100000", seed = String(Date.now() % 1e9)] = process.argv.slice(2);
process.exitCode = (await fuzz(Number(runs), Number(seed), console.log)) ? 0 : 1;
