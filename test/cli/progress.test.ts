import { expect, test } from "vitest";
import { startProgress } from "../../src/cli/progress.ts";

test.each([
  ["off a terminal", false, false],
  ["where quiet is asked for", true, true],
  ["on a terminal", true, false],
])("progress %s starts, moves and stops, and prints no result", (_, isTerminal, quiet) => {
  const printed: string[] = [];
  const print = (text: string) => void printed.push(text);
  async function* nothing(): AsyncGenerator<Uint8Array> {}
  const progress = startProgress(3, { stdin: nothing(), out: print, err: print, isTerminal, useColor: false }, quiet);
  for (const done of [1, 2, 3]) progress.advanceTo(done);
  progress.stop();
  expect(printed).toEqual([]);
});
