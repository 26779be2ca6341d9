import type { Review } from '@ellwand/shared/records/publishing';

/** Longest list that is still read: after that, a number. */
const NAMED = 8;

function joined(labels: readonly string[]): string {
  const shown = labels.slice(0, NAMED);
  const left = labels.length - shown.length;
  return shown.join(', ') + (left > 0 ? ` and ${left} more` : '');
}

/** What a publication changes, in a sentence: "Changes Title, Waist (bodice). Adds Picture, back." */
export function changesSentence({ changes, nextVersion }: Pick<Review, 'changes' | 'nextVersion'>): string {
  if (nextVersion === 1) return 'This garment becomes public for the first time, as shown beside this.';
  if (changes.length === 0) return 'Nothing differs from the version that is public now.';
  const verbs = { changed: 'Changes', added: 'Adds', removed: 'Removes' } as const;
  return (['changed', 'added', 'removed'] as const)
    .map((kind) => ({
      kind,
      labels: changes.filter((change) => change.kind === kind).map(({ label }) => label),
    }))
    .filter(({ labels }) => labels.length > 0)
    .map(({ kind, labels }) => `${verbs[kind]} ${joined(labels)}.`)
    .join(' ');
}
