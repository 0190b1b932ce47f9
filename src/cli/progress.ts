import { SingleBar } from "cli-progress";
import type { Io } from "./io.ts";

/** Shows how far a long run has come, on a terminal only. */
export interface Progress {
  advanceTo(done: number): void;
  stop(): void;
}

const silent: Progress = { advanceTo: () => {}, stop: () => {} };

export function startProgress(total: number, io: Io, quiet = false): Progress {
  if (quiet || !io.isTerminal) return silent;
  const bar = new SingleBar({ format: "{bar} {value} of {total}", clearOnComplete: true });
  bar.start(total, 0);
  return { advanceTo: (done) => bar.update(done), stop: () => bar.stop() };
}
