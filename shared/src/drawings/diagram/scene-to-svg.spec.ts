import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { kindIds } from '../../points/kinds.js';
import { paintSilhouette } from '../silhouettes/silhouette-for.js';
import { paintDiagram } from './paint-diagram.js';
import type { Scene } from './scene.js';
import { paperPalette, sceneToSvg } from './scene-to-svg.js';

const scene: Scene = {
  width: 40,
  height: 30,
  title: 'A "cuff" & <more>',
  clips: [{ id: 'c-0-1', paths: ['M0 0L9 9'] }],
  primitives: [
    { type: 'path', role: 'seam', d: 'M0 0L5 5', strokeWidth: 1.4, clip: 'c-0-1' },
    {
      type: 'point',
      pointId: 'cuff',
      letter: 'A',
      view: 'front',
      current: false,
      marks: [{ type: 'text', role: 'letter', x: 3, y: 4, size: 12, text: 'A', pointId: 'cuff' }],
    },
  ],
};

describe('a scene as SVG', () => {
  it('names what is seen, escaped, and carries classes for a style sheet', () => {
    const svg = sceneToSvg(scene);
    expect(svg).toContain('<title>A &quot;cuff&quot; &amp; &lt;more&gt;</title>');
    expect(svg).toContain('<clipPath id="c-0-1"><path d="M0 0L9 9"/></clipPath>');
    expect(svg).toContain(
      '<path class="drawing-seam" d="M0 0L5 5" stroke-width="1.4" clip-path="url(#c-0-1)"/>',
    );
    expect(svg).toContain(
      '<g data-point="cuff"><text class="drawing-letter" x="3" y="4" font-size="12">A</text></g>',
    );
    expect(svg).not.toContain('stroke="');
  });

  it('stands alone with a palette', () => {
    expect(sceneToSvg(scene, { palette: paperPalette })).toContain('stroke="#17212B"');
    expect(Object.keys(paperPalette)).toContain('ring-current');
  });

  it('never holds a style attribute, which a strict policy would refuse', () => {
    const whole = paintDiagram({ kind: 'dress', widthPx: 600, letters: { bust: 'A', hem: 'B' } })!;
    expect(sceneToSvg(whole, { palette: paperPalette })).not.toMatch(/\sstyle=/);
  });
});

it('has a rule in the screens’ style sheet for every role it can paint', () => {
  const sheet = readFileSync(new URL('../../../look/drawings.css', import.meta.url), 'utf8');
  for (const role of Object.keys(paperPalette)) expect(sheet).toMatch(new RegExp(`\\.drawing-${role}[ ,]`));
});

describe('silhouettes', () => {
  it.each(kindIds)('%s is drawn, cut to its size', (kind) => {
    const { width, height, primitives, clips } = paintSilhouette({ kind, pxPerMm: 0.1 });
    expect(width).toBeGreaterThan(10);
    expect(height).toBeGreaterThan(10);
    expect(primitives.some((entry) => entry.type === 'path' && entry.role === 'cloth')).toBe(true);
    for (const entry of primitives) {
      if (entry.type === 'path' && entry.clip) expect(clips.map((clip) => clip.id)).toContain(entry.clip);
    }
  });

  it('stand at one scale: a dress from shoulder to hem is many times a shoe', () => {
    const heights = (['dress', 'bodice', 'shoe'] as const).map(
      (kind) => paintSilhouette({ kind, pxPerMm: 0.2 }).height,
    );
    expect(heights[0]! / heights[2]!).toBeGreaterThan(8);
    expect(heights[1]!).toBeLessThan(heights[0]! / 2);
  });

  it('grow with the scale', () => {
    const [small, large] = [0.1, 0.2].map((pxPerMm) => paintSilhouette({ kind: 'coat', pxPerMm }).height - 4);
    expect(large! / small!).toBeCloseTo(2, 1);
  });
});
