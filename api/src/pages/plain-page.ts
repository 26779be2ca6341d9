/** A page for when the site itself cannot speak. Fixed sentences only: nothing from outside is put in. */
export function plainPage(title: string, sentence: string): string {
  return (
    '<!doctype html><html lang="en"><head><meta charset="utf-8">' +
    '<meta name="viewport" content="width=device-width, initial-scale=1"><meta name="robots" content="noindex">' +
    `<title>${title}</title></head><body><main><h1>${title}</h1><p>${sentence}</p></main></body></html>`
  );
}
