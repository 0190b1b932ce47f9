import { stat, writeFile } from "node:fs/promises";
import { dirname, resolve } from "node:path";
import writeFileAtomic from "write-file-atomic";
import { InputError } from "../errors.ts";
import { systemReason } from "./systemReason.ts";

/**
 * Refuses, before any work is done, destinations that cannot be written or that are an input of the same run under any
 * name. Throws InputError `unwritable` or `would-overwrite-input`.
 */
export async function checkDestinations(paths: readonly string[], inputs: readonly string[]): Promise<void> {
  const taken = new Map<string, string>();
  for (const input of inputs) taken.set(await identity(input), "an input of this run; inputs are never overwritten");
  for (const path of paths) {
    const inUse = taken.get(await identity(path));
    if (inUse) throw new InputError("would-overwrite-input", `Cannot write ${path}: it is ${inUse}.`, { file: path });
    taken.set(await identity(path), "also the destination of another output");
    await checkFolder(path);
  }
}

/** Writes the whole text or nothing: a run that is stopped leaves the former file. Throws InputError `unwritable`. */
export async function writeOutputFile(path: string, text: string): Promise<void> {
  try {
    // Devices and pipes, e.g. /dev/stdout, cannot be replaced by a finished file.
    const isSpecial = (await status(path))?.isFile() === false;
    await (isSpecial ? writeFile(path, text) : writeFileAtomic(path, text));
  } catch (error) {
    throw unwritable(path, systemReason(error), error);
  }
}

async function checkFolder(path: string): Promise<void> {
  if ((await status(path))?.isDirectory()) throw unwritable(path, "it is a folder");
  const folder = dirname(resolve(path));
  if (!(await status(folder))?.isDirectory()) throw unwritable(path, `the folder ${folder} does not exist`);
}

/** The same for every name of one file, links included; the absolute path for what does not exist yet. */
async function identity(path: string): Promise<string> {
  const found = await status(path);
  return found?.isFile() ? `${found.dev}:${found.ino}` : resolve(path);
}

async function status(path: string) {
  try {
    return await stat(path);
  } catch {
    return undefined;
  }
}

function unwritable(path: string, reason: string, cause?: unknown): InputError {
  return new InputError("unwritable", `Cannot write ${path}: ${reason}.`, { file: path }, { cause });
}
