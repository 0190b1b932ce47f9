import { mkdir, readFile } from "node:fs/promises";
import { homedir } from "node:os";
import { join } from "node:path";
import writeFileAtomic from "write-file-atomic";
import type { ByteCache } from "../curve/cachedFamily.ts";
import { systemReason } from "./systemReason.ts";
import { version } from "./version.ts";

/** Where a user's caches belong (XDG Base Directory Specification). */
export function defaultCacheFolder(): string {
  return join(process.env.XDG_CACHE_HOME || join(homedir(), ".cache"), "bulkwright", version);
}

/**
 * A cache of one file a key. Files appear whole or not at all, so runs at the same time do not disturb each other. A folder
 * that cannot be written costs time, not the result: it is noted once.
 */
export function fileCache(folder: string, note: (text: string) => void): ByteCache {
  const path = (key: string): string => join(folder, `${key}.bin`);
  return {
    read: (key) => readFile(path(key)).catch(() => undefined),
    write: async (key, bytes) => {
      try {
        await mkdir(folder, { recursive: true });
        await writeFileAtomic(path(key), Buffer.from(bytes));
      } catch (error) {
        note(`solved radii could not be kept in ${folder}: ${systemReason(error)}`);
      }
    },
  };
}
