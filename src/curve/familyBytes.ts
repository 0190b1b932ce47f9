import type { SolvedFamily } from "./solveFamily.ts";

const CHECKSUM_LENGTH = 32;

/**
 * A solved family as bytes: SHA-256 of the rest; length of the heading; heading as JSON; radii as little-endian doubles.
 * Checked test/curve/cachedFamily.test.ts
 */
export async function encodeFamily({ lattice: { logRadii, ...lattice }, error }: SolvedFamily): Promise<Uint8Array> {
  const heading = new TextEncoder().encode(JSON.stringify({ lattice, error }));
  const bytes = new Uint8Array(CHECKSUM_LENGTH + 4 + heading.length + 8 * logRadii.length);
  const view = new DataView(bytes.buffer);
  view.setUint32(CHECKSUM_LENGTH, heading.length, true);
  bytes.set(heading, CHECKSUM_LENGTH + 4);
  const start = CHECKSUM_LENGTH + 4 + heading.length;
  logRadii.forEach((value, i) => void view.setFloat64(start + 8 * i, value, true));
  bytes.set(await checksum(bytes), 0);
  return bytes;
}

/** Undefined if the bytes are not whole. */
export async function decodeFamily(bytes: Uint8Array): Promise<SolvedFamily | undefined> {
  if (bytes.length < CHECKSUM_LENGTH + 4) return undefined;
  const whole = Uint8Array.from(bytes);
  const sum = await checksum(whole);
  if (!sum.every((byte, i) => byte === whole[i])) return undefined;
  const view = new DataView(whole.buffer);
  const length = view.getUint32(CHECKSUM_LENGTH, true);
  const start = CHECKSUM_LENGTH + 4 + length;
  const { lattice, error } = JSON.parse(new TextDecoder().decode(whole.subarray(CHECKSUM_LENGTH + 4, start)));
  const logRadii = new Float64Array((whole.length - start) / 8);
  for (let i = 0; i < logRadii.length; i++) logRadii[i] = view.getFloat64(start + 8 * i, true);
  return { lattice: { ...lattice, logRadii }, error };
}

async function checksum(bytes: Uint8Array<ArrayBuffer>): Promise<Uint8Array> {
  return new Uint8Array(await crypto.subtle.digest("SHA-256", bytes.subarray(CHECKSUM_LENGTH)));
}
