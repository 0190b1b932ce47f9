import type { Io } from "./io.ts";

/** Shows how far a long run has come, on a terminal only. */
export interface Progress {
  advanceTo(done: number): void;
  stop(): void;
}

const silent: Progress = { advanceTo: () => {}, stop: () => {} };

export async function startProgress(total: number, io: Io, quiet: boolean): Promise<Progress> {
  if (quiet || !io.isTerminal) return silent;
  const { SingleBar } = await import("cli-progress");
  const bar = new SingleBar({ format: "{bar} {value} of {total}", clearOnComplete: true });
  bar.start(total, 0);
  return { advanceTo: (done) => bar.update(done), stop: () => bar.stop() };
}
