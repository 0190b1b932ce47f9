// Reading a long planet list against csv-parse's own array mode over the same chunks in the same run, by CPU time, and
// the memory the reader holds while at it.
import { Readable } from "node:stream";
import { parse } from "csv-parse";

const CHUNK_ROWS = 2000;

/** A list as chunks of bytes: our own columns, then fillers up to `columns`. */
function* list(rows, columns) {
  const own = ["name", "mass_earth", "mass_earth_minus", "mass_earth_plus"];
  const radius = ["radius_earth", "radius_earth_minus", "radius_earth_plus"];
  const fillers = Array.from({ length: columns - own.length - radius.length }, (_, i) => `extra_${i}`);
  yield Buffer.from(`${[...own, ...radius, ...fillers].join(",")}\n`);
  const tail = fillers.map((_, i) => `,${(i * 1.37).toFixed(3)}`).join("");
  for (let row = 0; row < rows; row += CHUNK_ROWS) {
    let text = "";
    for (let i = row; i < Math.min(row + CHUNK_ROWS, rows); i++) {
      const mass = 0.5 + ((i * 0.618034) % 20);
      text += `planet ${i},${mass.toFixed(3)},0.1,0.12,${(mass ** 0.27).toFixed(3)},0.05,0.04${tail}\n`;
    }
    yield Buffer.from(text);
  }
}

async function cpuSeconds(run) {
  const before = process.cpuUsage();
  await run();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1e6;
}

export async function listReading(report, { readPlanetList, EARTH_RADIUS }) {
  for (const [rows, columns] of [
    [1_000_000, 8],
    [200_000, 84],
  ]) {
    let peak = 0;
    let seen = 0;
    const ours = await cpuSeconds(async () => {
      const read = await readPlanetList(Readable.from(list(rows, columns)), {
        file: "list",
        earthRadius: EARTH_RADIUS,
      });
      for await (const _ of read.rows) if (++seen % 20_000 === 0) peak = Math.max(peak, process.memoryUsage.rss());
    });
    if (seen !== rows) throw new Error(`read ${seen} of ${rows} rows`);
    const theirs = await cpuSeconds(async () => {
      for await (const _ of Readable.from(list(rows, columns)).pipe(parse()));
    });
    report(`list of ${rows} rows, ${columns} columns: throughput over csv-parse's`, theirs / ours, "×", "0.5 or more");
    report(`list of ${rows} rows, ${columns} columns: memory`, peak / 2 ** 20, "MB", "at most 300");
  }
}
