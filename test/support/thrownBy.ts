/** What a function throws, for checks on its class, code and data at once; undefined if it throws nothing. */
export function thrownBy(run: () => unknown): unknown {
  try {
    run();
  } catch (error) {
    return error;
  }
  return undefined;
}
