import { escapeMarkup } from '../../common/escape-markup';

/** What a letter says; both its forms are made of this, so that they cannot differ. */
export interface LetterParts {
  readonly greeting: string;
  readonly paragraphs: readonly string[];
  readonly action: { readonly label: string; readonly href: string };
  readonly after: readonly string[];
  readonly sender: string;
}

export function asText({ greeting, paragraphs, action, after, sender }: LetterParts): string {
  return `${[greeting, ...paragraphs, `${action.label}:\n${action.href}`, ...after, sender].join('\n\n')}\n`;
}

/** Styles stand at the elements: mail programs drop style sheets. Colours as in `shared/look/tokens.css`. */
export function asMarkup({ greeting, paragraphs, action, after, sender }: LetterParts): string {
  const paragraph = (text: string, colour: string) =>
    `<p style="margin:0 0 16px;color:${colour}">${escapeMarkup(text)}</p>`;
  const href = escapeMarkup(action.href);
  const button =
    `<p style="margin:8px 0 24px"><a href="${href}" style="display:inline-block;padding:12px 20px;` +
    `border-radius:4px;background:#26418f;color:#ffffff;text-decoration:none;font-weight:600">` +
    `${escapeMarkup(action.label)}</a></p>`;
  return [
    '<!doctype html><html lang="en"><body style="margin:0;padding:32px 16px;background:#f6f7f5">',
    '<div style="max-width:520px;margin:0 auto;padding:32px;background:#ffffff;border:1px solid #d3d9d3;',
    'font:16px/24px Arial,sans-serif;color:#17212b">',
    ...[greeting, ...paragraphs].map((text) => paragraph(text, '#17212b')),
    button,
    ...after.map((text) => paragraph(text, '#414d58')),
    `<p style="margin:24px 0 0;padding-top:16px;border-top:1px solid #d3d9d3;color:#5a6670;font-size:14px">`,
    `${escapeMarkup(sender)}</p></div></body></html>`,
  ].join('');
}
