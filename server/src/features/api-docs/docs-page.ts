import type { ApiDescription, Operation } from './describe-api.ts';

const STYLE = `body{font:16px/1.5 system-ui,sans-serif;max-width:56rem;margin:2rem auto;padding:0 1rem;color:#1c1a17;background:#fbfaf7}
h1,h2{line-height:1.2}h2{margin-top:2.5rem;border-top:1px solid #cfc9bd;padding-top:1.5rem}code,pre{font:14px/1.45 ui-monospace,monospace}
h2 code{font-size:1.2rem;font-weight:600}pre{overflow:auto;max-height:26rem;background:#f1eee6;padding:.75rem}table{border-collapse:collapse}th,td{text-align:left;vertical-align:top;padding:.2rem 1rem .2rem 0}
summary{cursor:pointer;margin:.5rem 0}`;

/** A page that a person can read, without a script: the same description as /api/openapi.json. */
export function docsPage(api: ApiDescription): string {
  const operations = Object.entries(api.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => operationSection(method, path, operation)),
  );
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>Borewright API</title><style>${STYLE}</style></head>
<body>
<h1>Borewright API</h1>
<p>${escapeHtml(api.info.description)} All addresses are under <code>/api</code>.</p>
<p>For programs: <a href="/api/openapi.json">OpenAPI 3.1</a>, <a href="/api/design-document.schema.json">JSON Schema of the design document</a>.</p>
${operations.join('\n')}
</body>
</html>
`;
}

function operationSection(method: string, path: string, operation: Operation): string {
  return `<section id="${escapeHtml(operation.operationId)}">
<h2><code>${method.toUpperCase()} ${escapeHtml(path)}</code></h2>
<p>${escapeHtml(operation.summary)}${operation.security.length === 0 ? ' Needs no sign-in.' : ''}</p>
${parameterTable(operation)}
${schemaBlock('What to send', operation.requestBody)}
${answers(operation)}
</section>`;
}

function parameterTable({ parameters = [] }: Operation): string {
  if (parameters.length === 0) return '';
  const rows = parameters.map(
    (parameter) =>
      `<tr><td><code>${escapeHtml(parameter.name)}</code></td><td>${parameter.in}${parameter.required ? ', required' : ''}</td><td><code>${escapeHtml(JSON.stringify(parameter.schema))}</code></td></tr>`,
  );
  return `<table><tr><th>Name</th><th>Where</th><th>Value</th></tr>${rows.join('')}</table>`;
}

function answers({ responses }: Operation): string {
  const rows = Object.entries(responses).map(
    ([status, { description }]) => `<tr><td>${status}</td><td>${escapeHtml(description)}</td></tr>`,
  );
  const success = Object.entries(responses).find(([status]) => status.startsWith('2'));
  return `<table><tr><th>Status</th><th>Meaning</th></tr>${rows.join('')}</table>${schemaBlock('What comes back', success?.[1])}`;
}

function schemaBlock(title: string, holder: { content?: unknown } | undefined): string {
  if (holder?.content === undefined) return '';
  return `<details><summary>${title}</summary><pre>${escapeHtml(JSON.stringify(holder.content, null, 2))}</pre></details>`;
}

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

function escapeHtml(text: string): string {
  return text.replace(/[&<>"]/g, (character) => ENTITIES[character] ?? character);
}
