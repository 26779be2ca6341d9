const named: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text that stands in markup, and in quoted attributes, as it was written. */
export const escapeMarkup = (text: string): string =>
  text.replaceAll(/[&<>"']/g, (letter) => named[letter] ?? letter);
