/** `own-` and the name in small letters, with a figure where that is taken: “Loop to hem” is `own-loop-to-hem`. */
export function ownPointIdFor(name: string, taken: readonly string[]): string {
  const words = name
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .split(/[^a-z0-9]+/)
    .filter((word) => word !== '');
  const id = ['own', ...(words.length > 0 ? words : ['point'])].join('-').slice(0, LONGEST).replace(/-$/, '');
  if (!taken.includes(id)) return id;
  let figure = 2;
  while (taken.includes(`${id}-${figure}`)) figure++;
  return `${id}-${figure}`;
}

/** Room for the figure within the sixty characters of an id. */
const LONGEST = 55;
