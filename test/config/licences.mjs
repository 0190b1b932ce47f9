// The licence texts of the packages whose code ends up in dist/, as their licences require.
import { readdirSync, readFileSync } from "node:fs";

/** Text of all licences of the packages named in esbuild's `metafiles`, and of `others`. */
export function licencesOf(metafiles, others) {
  const inputs = metafiles.flatMap((metafile) => Object.keys(metafile.inputs));
  const bundled = inputs.flatMap((path) => /^node_modules\/((?:@[^/]+\/)?[^/]+)\//.exec(path)?.[1] ?? []);
  return [...new Set([...bundled, ...others])].sort().map(licenceOf).join("\n");
}

function licenceOf(name) {
  const folder = `node_modules/${name}`;
  const { version, license } = JSON.parse(readFileSync(`${folder}/package.json`, "utf8"));
  const file = readdirSync(folder).find((entry) => /^licen[cs]e/i.test(entry));
  const text = file ? readFileSync(`${folder}/${file}`, "utf8").trim() : "(no licence file in the package)";
  return `${"=".repeat(72)}\n${name} ${version} (${license})\n\n${text}\n`;
}
