import { createReadStream } from "node:fs";
import { access } from "node:fs/promises";
import { InputError } from "../errors.ts";
import type { Io } from "./io.ts";
import { systemReason } from "./systemReason.ts";

/** The bytes of a file, or of standard input for `-`. Throws InputError `unreadable`. */
export async function* readBytes(path: string, io: Io): AsyncGenerator<Uint8Array> {
  try {
    yield* path === "-" ? io.stdin : createReadStream(path);
  } catch (error) {
    throw unreadable(path, error);
  }
}

/** The same as UTF-8 text. Throws InputError `unreadable`. */
export async function readText(path: string, io: Io): Promise<string> {
  const decoder = new TextDecoder("utf-8", { fatal: true });
  const parts: string[] = [];
  try {
    for await (const bytes of readBytes(path, io)) parts.push(decoder.decode(bytes, { stream: true }));
    parts.push(decoder.decode());
  } catch (error) {
    throw error instanceof InputError ? error : unreadable(path, error);
  }
  return parts.join("");
}

export async function isThere(path: string): Promise<boolean> {
  return access(path).then(
    () => true,
    () => false,
  );
}

/** Text of our own, as if it were read. */
export async function* bytesOf(text: string): AsyncGenerator<Uint8Array> {
  yield new TextEncoder().encode(text);
}

/** How messages call an input. */
export function inputName(path: string): string {
  return path === "-" ? "standard input" : path;
}

function unreadable(path: string, cause: unknown): InputError {
  return new InputError(
    "unreadable",
    `Cannot read ${inputName(path)}: ${systemReason(cause)}.`,
    { file: path },
    { cause },
  );
}
