import { escapeHtml } from "./escape.ts";

/** What it takes to make a page again. */
export interface HowMade {
  readonly version: string;
  /** A sentence. */
  readonly earthRadius: string;
  readonly command: string;
}

/** Goes under a heading of the page's own. */
export function howMadeHtml({ version, earthRadius, command }: HowMade): string {
  return `<p>Bulkwright ${escapeHtml(version)}. ${escapeHtml(earthRadius)}. The same command and files give the same page:</p>
<pre><code>${escapeHtml(command)}</code></pre>`;
}
