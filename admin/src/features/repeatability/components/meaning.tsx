const key = 'inline-block h-0 w-7 shrink-0 translate-y-[-0.3em] border-t-2';

/** What the figures mean, in words, and how to read the plots. */
export function Meaning() {
  return (
    <section aria-label="What the figures mean" className="mb-6 max-w-text text-table text-ink-2">
      <p>
        The technical error is what one reading is usually off by. R says how much of the difference between
        readings comes from the garments rather than from the reading; 0.95 is a fair aim. Some 95 in 100
        second readings lie within the limits of agreement of the first. Each point stands by itself, for a
        waist and a hem are not read alike. The page is about points, not about people: nobody is named.
      </p>
      <ul className="mt-3 flex flex-wrap gap-x-6 gap-y-1 text-label">
        <li className="flex items-baseline gap-2">
          <span aria-hidden="true" className={`${key} border-indigo`} />
          mean difference
        </li>
        <li className="flex items-baseline gap-2">
          <span aria-hidden="true" className={`${key} border-dashed border-madder`} />
          limits of agreement
        </li>
        <li className="flex items-baseline gap-2">
          <span aria-hidden="true" className="inline-block size-2.5 rounded-full bg-ink-3" />a later reading
          against the first
        </li>
      </ul>
    </section>
  );
}
