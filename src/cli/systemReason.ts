const reasons: Readonly<Record<string, string>> = {
  ENOENT: "it does not exist",
  ENOTDIR: "a part of the path is not a folder",
  EISDIR: "it is a folder",
  EACCES: "permission denied",
  EPERM: "not permitted",
  EROFS: "the file system is read-only",
  ENOSPC: "no space left",
  ELOOP: "its symbolic links form a cycle",
  ERR_ENCODING_INVALID_ENCODED_DATA: "it is not UTF-8 text",
};

/** Why the system refused, in words. */
export function systemReason(error: unknown): string {
  const { code = "", message } = error as NodeJS.ErrnoException;
  return reasons[code] ?? message;
}
