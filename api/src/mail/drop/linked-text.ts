import { escapeMarkup } from '../../common/escape-markup';

const address = /https?:\/\/[^\s<>"]+/g;
/** Signs that end a sentence rather than an address. */
const sentenceEnd = /[.,;:!?)\]]+$/;

/** A letter's text as markup: everything as it was written, with its web addresses to click on. */
export function linkedText(text: string): string {
  const pieces: string[] = [];
  let done = 0;
  for (const match of text.matchAll(address)) {
    const href = match[0].replace(sentenceEnd, '');
    pieces.push(escapeMarkup(text.slice(done, match.index)), link(href));
    done = match.index + href.length;
  }
  return [...pieces, escapeMarkup(text.slice(done))].join('');
}

const link = (href: string) => `<a href="${escapeMarkup(href)}">${escapeMarkup(href)}</a>`;
