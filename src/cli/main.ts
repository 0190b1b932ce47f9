#!/usr/bin/env node
import { run } from "./run.ts";

// Files appear only once they are complete (outputFile.ts), so stopping at once leaves nothing half-written.
process.once("SIGINT", () => process.exit(130));
// The reader of a pipe has seen enough, as in `| head`.
for (const stream of [process.stdout, process.stderr]) {
  stream.on("error", (error: NodeJS.ErrnoException) => {
    if (error.code !== "EPIPE") throw error;
    process.exit();
  });
}

process.exitCode = await run(process.argv.slice(2), {
  stdin: process.stdin,
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
  isTerminal: process.stderr.isTTY === true,
  useColor: process.stderr.isTTY === true && !process.env.NO_COLOR,
});
