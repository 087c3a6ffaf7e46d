import { PROBLEMS } from '#server/errors.ts';
import type { Endpoint } from '#server/http/endpoint.ts';
import { problemsOf } from './problems-of.ts';

/** A plain page of the API for people: what there is, what it asks for, what it refuses. No script. */
export function openApiPage(endpoints: readonly Endpoint[]): string {
  const tags = [...new Set(endpoints.map(({ tag }) => tag))];
  return `<!doctype html>
<html lang="en">
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Featherbeam: the API</title>
<style>${STYLE}</style>
<main>
<h1>The API</h1>
<p>JSON under <code>/api</code>; lengths in mm, masses in g, angles in degrees, x aft, y to starboard, z up. The exact
schemas are in <a href="/api/openapi.json">the OpenAPI description</a>. A write of a glider or a material carries the
<code>ETag</code> it was made from as <code>If-Match</code>; a creation may carry a UUID as <code>Idempotency-Key</code>,
so that sending it twice makes one row. Lists are read on with <code>?cursor=</code> from <code>nextCursor</code>.</p>
${tags
  .map((tag) =>
    section(
      tag,
      endpoints.filter((endpoint) => endpoint.tag === tag),
    ),
  )
  .join('\n')}
${refusals()}
</main>
</html>
`;
}

function section(tag: string, endpoints: readonly Endpoint[]): string {
  return `<h2>${escape(tag)}</h2>
<table><thead><tr><th>Request</th><th>What it does</th><th>Who</th><th>Answer</th><th>Refusals</th></tr></thead>
<tbody>${endpoints.map(row).join('\n')}</tbody></table>`;
}

const WHO = { public: 'anybody', anyone: 'anybody', 'signed-in': 'signed in' } as const;

function row(endpoint: Endpoint): string {
  const refused = problemsOf(endpoint).map((code) => `<a href="#${code}">${code}</a>`);
  return `<tr><th scope="row"><code>${endpoint.method.toUpperCase()} /api${escape(endpoint.path)}</code></th>
<td>${escape(endpoint.summary).replace(/`(.+?)`/g, '<code>$1</code>')}</td><td>${WHO[endpoint.access]}</td><td>${endpoint.answer.status}</td>
<td>${refused.join(' ')}</td></tr>`;
}

function refusals(): string {
  const rows = Object.entries(PROBLEMS).map(
    ([code, { status, title }]) =>
      `<tr id="${code}"><th scope="row"><code>${code}</code></th><td>${status}</td><td>${escape(title)}</td></tr>`,
  );
  return `<h2>Refusals</h2>
<p>Problem details (RFC 9457) with a stable <code>code</code>. <code>invalid_input</code> names every wrong field at once,
each by its JSON pointer, in <code>errors</code>.</p>
<table><thead><tr><th>Code</th><th>Status</th><th>Meaning</th></tr></thead><tbody>${rows.join('\n')}</tbody></table>`;
}

function escape(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;');
}

const STYLE = `
:root { color-scheme: light dark; --paper: #fdfbf6; --pencil: #2a2926; --rule: #b9b2a0; --ink: #1d4f91; }
@media (prefers-color-scheme: dark) { :root { --paper: #1f2226; --pencil: #ece7db; --rule: #555b64; --ink: #8fb9ef; } }
body { margin: 0; background: var(--paper); color: var(--pencil); font: 15px/1.5 system-ui, sans-serif; }
main { max-width: 70rem; margin: 0 auto; padding: 24px 16px 64px; }
a { color: var(--ink); }
table { border-collapse: collapse; width: 100%; }
th, td { border-bottom: 1px solid var(--rule); padding: 6px 8px; text-align: left; vertical-align: top; font-weight: 400; }
thead th { font-weight: 600; }
code { font: 13px/1.5 ui-monospace, monospace; }
tr:target { outline: 2px solid var(--ink); }
`;
