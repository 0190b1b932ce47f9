import { run } from "../../src/cli/run.ts";

export interface Outcome {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

/** Runs a command line inside the test and captures what it prints. */
export async function runCommand(
  args: readonly string[],
  options: { stdin?: string; isTerminal?: boolean; useColor?: boolean } = {},
): Promise<Outcome> {
  let out = "";
  let err = "";
  const code = await run(args, {
    stdin: chunksOf(options.stdin ?? ""),
    out: (text) => {
      out += text;
    },
    err: (text) => {
      err += text;
    },
    isTerminal: options.isTerminal ?? false,
    useColor: options.useColor ?? false,
  });
  return { code, out, err };
}

async function* chunksOf(text: string): AsyncGenerator<Uint8Array> {
  yield new TextEncoder().encode(text);
}
