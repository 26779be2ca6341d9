const longest = 200;

/** The name a file had on the sender's machine, fit to be shown: one line, no folders. Never used as a path. */
export function plainFileName(name: string): string {
  const last = name.normalize('NFC').split(/[/\\]/).at(-1) ?? '';
  const shown = [...last]
    .filter((c) => !/[\p{Cc}\p{Cf}]/u.test(c))
    .join('')
    .trim();
  return [...shown].slice(0, longest).join('') || 'picture';
}
