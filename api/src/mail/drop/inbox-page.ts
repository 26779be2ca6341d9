import { escapeMarkup } from '../../common/escape-markup';
import type { DroppedLetter } from './inbox';
import { linkedText } from './linked-text';

const time = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });

/** The list of letters; looks for new ones by itself. */
export function inboxPage(letters: readonly DroppedLetter[]): string {
  const list =
    letters.length === 0
      ? '<p class="empty">No letters yet. What Ellwand sends will appear here.</p>'
      : `<ul>${letters.map(item).join('')}</ul>`;
  const refresh = '<meta http-equiv="refresh" content="5">';
  return page('Mail drop', refresh, `<h1>Mail drop</h1><p>${note}</p>${list}`);
}

/** One letter, to read. */
export function letterPage(letter: DroppedLetter): string {
  const heads = [
    ['From', letter.from],
    ['To', letter.to.join(', ')],
    ['Received', time.format(letter.receivedAt)],
  ];
  const rows = heads
    .map(([name = '', value = '']) => `<dt>${name}</dt><dd>${escapeMarkup(value)}</dd>`)
    .join('');
  return page(
    letter.subject,
    '',
    `<p><a href="/">All letters</a></p><h1>${escapeMarkup(letter.subject)}</h1><dl>${rows}</dl>` +
      `<article>${linkedText(letter.text)}</article>`,
  );
}

export const noLetterPage = (): string =>
  page(
    'No such letter',
    '',
    '<p><a href="/">All letters</a></p><h1>No such letter</h1><p>It has made room for later ones.</p>',
  );

const note = 'Letters stay on this machine: nothing is sent on, and they are forgotten when Ellwand stops.';

function item({ id, to, subject, receivedAt }: DroppedLetter): string {
  return (
    `<li><a href="/letters/${id}"><strong>${escapeMarkup(subject)}</strong>` +
    `<span>${escapeMarkup(to.join(', '))}</span><time>${time.format(receivedAt)}</time></a></li>`
  );
}

const page = (title: string, head: string, body: string): string =>
  '<!doctype html><html lang="en"><head><meta charset="utf-8">' +
  `<meta name="viewport" content="width=device-width"><title>${escapeMarkup(title)}</title>${head}` +
  `<link rel="stylesheet" href="/style.css"></head><body><main>${body}</main></body></html>`;

/** Colours of `shared/look/tokens.css`; the page stands by itself. */
export const inboxStyle = `
:root { color-scheme: light; }
body { margin: 0; background: #f6f7f5; color: #17212b; font: 1rem/1.5 Inter, 'Liberation Sans', Arial, sans-serif; }
main { max-width: 44rem; margin: 0 auto; padding: 2.5rem 1rem 5rem; }
h1 { margin: 0 0 0.75rem; font: 2.125rem/1.2 'Cormorant Garamond', 'Times New Roman', serif; overflow-wrap: anywhere; }
p { margin: 0 0 1.25rem; color: #414d58; }
a { color: #26418f; }
a:focus-visible { outline: 2px solid #26418f; outline-offset: 2px; }
ul { margin: 0; padding: 0; list-style: none; background: #fff; border: 1px solid #d3d9d3; border-radius: 4px; }
li + li { border-top: 1px solid #d3d9d3; }
li a { display: grid; grid-template-columns: 1fr auto; gap: 0 1rem; padding: 0.75rem 1rem; color: inherit; text-decoration: none; }
li a:hover { background: #ecefeb; }
li strong { font-weight: 600; overflow-wrap: anywhere; }
li span { grid-column: 1; color: #414d58; font-size: 0.9375rem; overflow-wrap: anywhere; }
li time { grid-row: 1; grid-column: 2; color: #5a6670; font-size: 0.8125rem; line-height: 1.5rem; white-space: nowrap; }
.empty { padding: 2rem 1rem; background: #fff; border: 1px solid #d3d9d3; border-radius: 4px; text-align: center; }
dl { display: grid; grid-template-columns: auto 1fr; gap: 0.25rem 1rem; margin: 0 0 1.5rem; font-size: 0.9375rem; }
dt { color: #5a6670; }
dd { margin: 0; overflow-wrap: anywhere; }
article { padding: 1.5rem; background: #fff; border: 1px solid #d3d9d3; border-radius: 4px; white-space: pre-wrap; overflow-wrap: anywhere; }
`;
