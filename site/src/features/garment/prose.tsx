/** A heading with plain text beneath; paragraphs stand where the writer left an empty line. Nothing when empty. */
export function Prose({ title, text }: { readonly title: string; readonly text: string }) {
  const paragraphs = text.split(/\n\s*\n/).filter((paragraph) => paragraph.trim() !== '');
  if (paragraphs.length === 0) return null;
  return (
    <section>
      <h2>{title}</h2>
      {paragraphs.map((paragraph, index) => (
        <p key={index}>{paragraph}</p>
      ))}
    </section>
  );
}
