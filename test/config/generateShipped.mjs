// Writes src/library/shipped.generated.ts: the files of compositions/ as text, so that neither a web page nor a test
// needs a file system to have them.
import { readdirSync, readFileSync, writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../../", import.meta.url));
const files = ["compositions", "compositions/materials", "compositions/families"].flatMap((folder) =>
  readdirSync(root + folder, { withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map(({ name }) => `${folder}/${name}`)
    .sort()
    .map((path) => ({ path, text: readFileSync(root + path, "utf8") })),
);

writeFileSync(
  `${root}src/library/shipped.generated.ts`,
  `// Written by test/config/generateShipped.mjs from compositions/; do not edit.
import type { LibraryFile } from "./libraryFiles.ts";

export const shippedFiles: readonly LibraryFile[] = ${JSON.stringify(files, null, 1)};
`,
);
