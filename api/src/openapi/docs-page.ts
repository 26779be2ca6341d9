import type { OpenAPIObject } from '@nestjs/swagger';
import { escapeMarkup } from '../common/escape-markup';

type Path = OpenAPIObject['paths'][string];
type Operation = NonNullable<Path['get']>;

const methods = ['get', 'post', 'put', 'patch', 'delete'] as const;

interface Route {
  readonly method: string;
  readonly address: string;
  readonly group: string;
  readonly operation: Operation;
}

/** The description as one page without scripts: what there is, who may ask, what is sent and answered. */
export function docsPage(document: OpenAPIObject): string {
  const routes = routesOf(document);
  const groups = [...new Set(routes.map(({ group }) => group))].sort();
  const sections = groups.map((group) =>
    section(
      group,
      routes.filter((route) => route.group === group),
    ),
  );
  return [
    '<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Ellwand API</title>',
    '<meta name="viewport" content="width=device-width"><link rel="stylesheet" href="/api/docs.css"></head><body>',
    '<main><h1>Ellwand API</h1>',
    `<p>${withCode(document.info.description ?? '')} The same as <a href="/api/openapi.json">OpenAPI 3.1</a>.</p>`,
    '<p>Refusals are problem details (RFC 9457) with a stable <code>code</code>. Changes of records carry ',
    '<code>If-Match: "version"</code>.</p>',
    ...sections,
    '</main></body></html>',
  ].join('');
}

function routesOf(document: OpenAPIObject): Route[] {
  return Object.entries(document.paths).flatMap(([address, path]) =>
    methods.flatMap((method) => {
      const operation = path[method];
      return operation ? [{ method, address, group: operation.tags?.[0] ?? 'Other', operation }] : [];
    }),
  );
}

function section(group: string, routes: readonly Route[]): string {
  const rows = routes.map(row).join('');
  const head =
    '<tr><th scope="col">Address</th><th scope="col">Who</th><th scope="col">Sent</th><th scope="col">Answered</th></tr>';
  return `<h2>${escapeMarkup(group)}</h2><table><thead>${head}</thead><tbody>${rows}</tbody></table>`;
}

function row({ method, address, operation }: Route): string {
  const who = (operation as { 'x-entry'?: string })['x-entry'] ?? '';
  const cells = [
    `<b>${method.toUpperCase()}</b> <code>${escapeMarkup(address)}</code>`,
    escapeMarkup(who),
    escapeMarkup(nameIn(JSON.stringify(operation.requestBody ?? {}))),
    escapeMarkup(answers(operation)),
  ];
  return `<tr>${cells.map((cell) => `<td>${cell}</td>`).join('')}</tr>`;
}

const answers = ({ responses }: Operation): string =>
  Object.entries(responses)
    .filter(([status]) => status !== 'default')
    .map(([status, response]) => `${status} ${nameIn(JSON.stringify(response))}`.trim())
    .join(', ');

/** The schema that a part of the description points at, without the code's own suffixes. */
const nameIn = (part: string): string =>
  (/#\/components\/schemas\/(\w+)/.exec(part)?.[1] ?? '').replace(/(Dto)?(_Output)?$/, '');

/** Escaped, with what stands in backticks as code. */
const withCode = (text: string): string => escapeMarkup(text).replaceAll(/`([^`]+)`/g, '<code>$1</code>');

/** Colours of `shared/look/tokens.css`; the page stands by itself. */
export const docsStyle = `
:root { color-scheme: light; }
body { margin: 0; background: #f6f7f5; color: #17212b; font: 1rem/1.5 'Inter Ellwand', Arial, sans-serif; }
main { max-width: 72rem; margin: 0 auto; padding: 3rem 1rem 6rem; }
h1 { font: 2.625rem/1.15 'Cormorant Ellwand', 'Times New Roman', serif; margin: 0 0 1rem; }
h2 { font: 1.75rem/1.2 'Cormorant Ellwand', 'Times New Roman', serif; margin: 3rem 0 0.75rem; }
p { max-width: 44rem; }
a { color: #26418f; }
table { width: 100%; table-layout: fixed; border-collapse: collapse; background: #fff; border: 1px solid #d3d9d3; font-size: 0.9375rem; }
th, td { padding: 0.5rem 0.75rem; border-bottom: 1px solid #d3d9d3; text-align: left; vertical-align: top; }
th { color: #5a6670; font-size: 0.8125rem; font-weight: 500; }
th:first-child { width: 52%; }
th:nth-child(2) { width: 14%; }
b { display: inline-block; min-width: 4.5em; font-weight: 600; font-size: 0.8125rem; }
code { font-size: 0.875rem; overflow-wrap: anywhere; }
@media (max-width: 640px) { td:nth-child(3), th:nth-child(3) { display: none; } }
`;
