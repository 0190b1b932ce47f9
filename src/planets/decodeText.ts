import { InputError } from "../errors.ts";

const MEBIBYTE = 2 ** 20;
/** Real lists compress 5 to 60 times; a bomb does about 1000 times. Small files are let through whatever their ratio. */
const GZIP_RATIO_LIMIT = 300;
const GZIP_RATIO_FREE_BYTES = 64 * MEBIBYTE;

/**
 * Bytes of a list as text: gunzips, finds the encoding (byte-order mark, UTF-16 by its zero bytes, UTF-8, otherwise
 * Windows-1252, the superset of Latin-1 that spreadsheets write), in constant memory.
 * Throws `gzip-damaged`, `gzip-too-large`.
 */
export async function* decodeText(chunks: AsyncIterable<Uint8Array>, file: string): AsyncGenerator<string> {
  const source = await startWithAtLeast(4, chunks);
  const zipped = source.head[0] === 0x1f && source.head[1] === 0x8b;
  const plain = zipped ? await startWithAtLeast(4, gunzip(source.all, file)) : source;
  const utf16 = utf16Label(plain.head);
  yield* utf16 === undefined ? decodeBytes(plain.all) : decodeUtf16(plain.all, utf16);
}

interface Started {
  readonly head: Uint8Array;
  readonly all: AsyncIterable<Uint8Array>;
}

async function startWithAtLeast(bytes: number, chunks: AsyncIterable<Uint8Array>): Promise<Started> {
  const iterator = chunks[Symbol.asyncIterator]();
  let head: Uint8Array = new Uint8Array(0);
  while (head.length < bytes) {
    const next = await iterator.next();
    if (next.done) break;
    head = head.length === 0 ? next.value : concatenate(head, next.value);
  }
  async function* all(): AsyncGenerator<Uint8Array> {
    yield head;
    yield* { [Symbol.asyncIterator]: () => iterator };
  }
  return { head, all: all() };
}

function concatenate(first: Uint8Array, second: Uint8Array): Uint8Array {
  const joined = new Uint8Array(first.length + second.length);
  joined.set(first);
  joined.set(second, first.length);
  return joined;
}

async function* gunzip(chunks: AsyncIterable<Uint8Array>, file: string): AsyncGenerator<Uint8Array> {
  let read = 0;
  let written = 0;
  const iterator = chunks[Symbol.asyncIterator]();
  const zipped = new ReadableStream<BufferSource>({
    async pull(controller) {
      const next = await iterator.next();
      if (next.done) return controller.close();
      read += next.value.length;
      controller.enqueue(new Uint8Array(next.value));
    },
  });
  const reader = zipped.pipeThrough(new DecompressionStream("gzip")).getReader();
  try {
    for (;;) {
      const { done, value } = await reader.read().catch((cause: unknown) => Promise.reject(damaged(file, cause)));
      if (done) return;
      written += value.length;
      if (written > GZIP_RATIO_FREE_BYTES && written > GZIP_RATIO_LIMIT * read) throw tooLarge(file, read, written);
      yield value;
    }
  } finally {
    await reader.cancel().catch(() => undefined);
  }
}

const damaged = (file: string, cause: unknown): InputError =>
  new InputError(
    "gzip-damaged",
    `${file}: the compressed file is damaged or cut off; fetch or compress it again`,
    { file },
    { cause },
  );

const tooLarge = (file: string, read: number, written: number): InputError =>
  new InputError(
    "gzip-too-large",
    `${file}: ${read} compressed bytes have become ${written}, more than the limit of ${GZIP_RATIO_LIMIT} times; ` +
      "no planet list does that. If it is one, unpack it yourself first",
    { file },
  );

function utf16Label(head: Uint8Array): "utf-16le" | "utf-16be" | undefined {
  const [a, b, c, d] = head;
  if (a === 0xff && b === 0xfe) return "utf-16le";
  if (a === 0xfe && b === 0xff) return "utf-16be";
  if (a !== 0 && b === 0 && c !== 0 && d === 0) return "utf-16le";
  if (a === 0 && b !== 0 && c === 0 && d !== 0) return "utf-16be";
  return undefined;
}

async function* decodeUtf16(chunks: AsyncIterable<Uint8Array>, label: string): AsyncGenerator<string> {
  const decoder = new TextDecoder(label);
  for await (const chunk of chunks) yield decoder.decode(chunk, { stream: true });
  yield decoder.decode();
}

/**
 * UTF-8 until a byte sequence proves otherwise, then Windows-1252: everything before was plain ASCII in such a file.
 * Pieces are cut after an ASCII byte, which is never inside a UTF-8 character.
 */
async function* decodeBytes(chunks: AsyncIterable<Uint8Array>): AsyncGenerator<string> {
  const utf8 = new TextDecoder("utf-8", { fatal: true, ignoreBOM: true });
  const windows1252 = new TextDecoder("windows-1252");
  let isUtf8 = true;
  const decode = (bytes: Uint8Array): string => {
    if (isUtf8) {
      try {
        return utf8.decode(bytes);
      } catch {
        isUtf8 = false;
      }
    }
    return windows1252.decode(bytes);
  };
  let rest: Uint8Array = new Uint8Array(0);
  let first = true;
  for await (const chunk of chunks) {
    const bytes = rest.length === 0 ? chunk : concatenate(rest, chunk);
    const end = lastAsciiEnd(bytes);
    rest = bytes.subarray(end);
    if (end === 0) continue;
    const text = decode(bytes.subarray(0, end));
    yield first ? text.replace(/^\uFEFF/, "") : text;
    first = false;
  }
  if (rest.length > 0) yield decode(rest);
}

function lastAsciiEnd(bytes: Uint8Array): number {
  let end = bytes.length;
  while (end > 0 && (bytes[end - 1] ?? 0) >= 0x80) end--;
  return end;
}
