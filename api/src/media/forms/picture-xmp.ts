const escapes: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };
const escape = (text: string) => text.replace(/[&<>"]/g, (c) => escapes[c] ?? c);

const alternatives = (name: string, text: string) =>
  `<${name}><rdf:Alt><rdf:li xml:lang="x-default">${escape(text)}</rdf:li></rdf:Alt></${name}>`;

/**
 * The little that a served picture says of itself: caption and credit line, as XMP (ISO 16684-1). The camera's
 * own metadata, with place and time, is left out of every form.
 */
export function pictureXmp({ caption, credit }: { caption: string; credit: string }): string {
  const said = [
    caption && alternatives('dc:description', caption),
    credit && `${alternatives('dc:rights', credit)}<photoshop:Credit>${escape(credit)}</photoshop:Credit>`,
  ].join('');
  return (
    '<?xpacket begin="\uFEFF" id="W5M0MpCehiHzreSzNTczkc9d"?><x:xmpmeta xmlns:x="adobe:ns:meta/">' +
    '<rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><rdf:Description rdf:about="" ' +
    'xmlns:dc="http://purl.org/dc/elements/1.1/" xmlns:photoshop="http://ns.adobe.com/photoshop/1.0/">' +
    `${said}</rdf:Description></rdf:RDF></x:xmpmeta><?xpacket end="r"?>`
  );
}
