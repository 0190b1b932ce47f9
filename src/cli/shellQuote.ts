/**
 * One command-line argument as a POSIX shell reads it back. Control characters take the `$'…'` form (POSIX.1-2024), so
 * that the command stays on one line.
 */
export function shellQuote(argument: string): string {
  if (/^[\w@%+=:,./-]+$/.test(argument)) return argument;
  if (!/\p{Cc}/u.test(argument)) return `'${argument.replaceAll("'", "'\\''")}'`;
  const escaped = argument.replace(/[\\']/g, "\\$&").replace(/\p{Cc}/gu, octalBytes);
  return `$'${escaped}'`;
}

function octalBytes(character: string): string {
  return [...new TextEncoder().encode(character)].map((byte) => `\\${byte.toString(8).padStart(3, "0")}`).join("");
}
