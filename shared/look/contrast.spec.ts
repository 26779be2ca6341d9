import { readFile } from 'node:fs/promises';
import { describe, expect, it } from 'vitest';

const css = await readFile(new URL('./tokens.css', import.meta.url), 'utf8');
const [light = '', dark = ''] = css.split("[data-theme='dark']");

function colours(block: string): Map<string, string> {
  const found = [...block.matchAll(/--color-([a-z0-9-]+): (#[0-9a-f]{6});/g)];
  return new Map(found.map(([, name = '', hex = '']) => [name, hex]));
}
const lightColours = colours(light);
const darkColours = new Map([...lightColours, ...colours(dark)]);

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const channel = parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
function contrast(palette: Map<string, string>, one: string, other: string): number {
  const [a = 0, b = 0] = [one, other].map((name) => luminance(palette.get(name) ?? '#808080'));
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

const text = ['ink', 'ink-2', 'ink-3', 'indigo', 'indigo-deep', 'madder'].flatMap((name) =>
  ['paper', 'sheet', 'well'].map((ground) => [name, ground] as const),
);
const pairs = [
  ...text,
  ['on-indigo', 'indigo'],
  ['on-weld', 'weld'],
  ['indigo', 'indigo-tint'],
  ['madder', 'madder-tint'],
  ['weld-text', 'weld-tint'],
  ['verdigris', 'verdigris-tint'],
  ['logwood', 'logwood-tint'],
] as const;

describe.each([
  ['light', lightColours],
  ['dark', darkColours],
])('the %s colours', (_, palette) => {
  it.each(pairs)('set %s on %s at 4.5 to 1 or more', (name, ground) => {
    expect(contrast(palette, name, ground)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(['paper', 'sheet', 'well'])('draw the edges of inputs on %s at 3 to 1 or more', (ground) => {
    expect(contrast(palette, 'rule', ground)).toBeGreaterThanOrEqual(3);
  });
});
