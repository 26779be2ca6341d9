/** A function whose last answers are kept, the longest unused going first. `most` bounds what is held. */
export function remembering<Request, Answer>(
  keyOf: (request: Request) => string,
  work: (request: Request) => Answer,
  most: number,
): (request: Request) => Answer {
  const kept = new Map<string, { readonly answer: Answer }>();
  return (request) => {
    const key = keyOf(request);
    const found = kept.get(key) ?? { answer: work(request) };
    kept.delete(key);
    kept.set(key, found);
    const [oldest] = kept.keys();
    if (kept.size > most && oldest !== undefined) kept.delete(oldest);
    return found.answer;
  };
}
