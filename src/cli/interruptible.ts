import { setImmediate } from "node:timers/promises";

const itemsPerTurn = 32;

/** The items of a long computation, with pauses in which Ctrl-C is heard. */
export async function* interruptible<T>(items: Iterable<T>): AsyncGenerator<T> {
  let done = 0;
  for (const item of items) {
    yield item;
    done += 1;
    if (done % itemsPerTurn === 0) await setImmediate();
  }
}

/** All items, once they have come. */
export async function allOf<T>(items: AsyncIterable<T>): Promise<T[]> {
  const all: T[] = [];
  for await (const item of items) all.push(item);
  return all;
}
