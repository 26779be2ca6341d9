/** What a picture that no camera took says of itself; see `media-samples/`. */
const renderedMark = 'Rendered; invented garment.';

/**
 * The little that a served picture says of itself, as XMP (ISO 16684-1): whether it was rendered. The camera's own
 * metadata, with place and time, is left out of every form. So are caption and credit: a form is made once, before
 * anybody has reviewed them, and what is taken out of a draft must not go on standing in a file. Pages say both.
 */
export function pictureXmp({ caption }: { readonly caption: string }): string {
  const isRendered = caption.toLowerCase().includes(renderedMark.toLowerCase());
  const said = isRendered
    ? `<dc:description><rdf:Alt><rdf:li xml:lang="x-default">${renderedMark}</rdf:li></rdf:Alt></dc:description>`
    : '';
  return (
    '<?xpacket begin="\uFEFF" id="W5M0MpCehiHzreSzNTczkc9d"?><x:xmpmeta xmlns:x="adobe:ns:meta/">' +
    '<rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><rdf:Description rdf:about="" ' +
    `xmlns:dc="http://purl.org/dc/elements/1.1/">${said}</rdf:Description></rdf:RDF></x:xmpmeta><?xpacket end="r"?>`
  );
}
