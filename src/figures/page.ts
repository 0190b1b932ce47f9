import { escapeHtml, escapeScript } from "./escape.ts";
import { pageStyle } from "./pageStyle.ts";

/** A self-contained page; `body` and `style` are finished HTML and CSS, `scripts` are programs of ours. */
export interface Page {
  readonly title: string;
  readonly style?: string;
  readonly body: string;
  /** Data blocks the scripts read, already safe for a script element: id → JSON. */
  readonly data?: Readonly<Record<string, string>>;
  readonly scripts?: readonly string[];
}

/**
 * One HTML file that works from a file URL and asks the network for nothing: its security policy forbids every
 * request, and every script but those given here, known by their hash.
 */
export async function pageHtml({ title, style = "", body, data = {}, scripts = [] }: Page): Promise<string> {
  const programs = scripts.map(escapeScript);
  const policy = contentSecurityPolicy(await Promise.all(programs.map(sha256)));
  const blocks = Object.entries(data).map(
    ([id, json]) => `<script type="application/json" id="${id}">${json}</script>`,
  );
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${policy}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<meta name="referrer" content="no-referrer">
<title>${escapeHtml(title)}</title>
<link rel="icon" href="data:,">
<style>
${pageStyle}${style}</style>
</head>
<body>
${body}
${blocks.join("\n")}
${programs.map((program) => `<script>${program}</script>`).join("\n")}
</body>
</html>
`;
}

/** Inline styles and images made by the drawing itself (its export button) are all that is allowed besides. */
function contentSecurityPolicy(hashes: readonly string[]): string {
  const scripts = hashes.length > 0 ? hashes.map((hash) => `'sha256-${hash}'`).join(" ") : "'none'";
  return [
    "default-src 'none'",
    `script-src ${scripts}`,
    "style-src 'unsafe-inline'",
    "img-src data: blob:",
    "base-uri 'none'",
    "form-action 'none'",
  ].join("; ");
}

async function sha256(text: string): Promise<string> {
  const digest = await crypto.subtle.digest("SHA-256", new TextEncoder().encode(text));
  return btoa(String.fromCharCode(...new Uint8Array(digest)));
}
