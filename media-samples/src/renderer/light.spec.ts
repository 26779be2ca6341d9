import { describe, expect, it } from 'vitest';
import { plain } from '../cloths/cloth';
import { lightScene, studioRays, type Studio } from './light';
import { see } from './normals';
import { Scene } from './scene';
import { unit, type Vec3 } from './tube';

const studio: Studio = {
  keyTowards: [0, 0, 1],
  keySamples: 24,
  fillSamples: 40,
  reach: 50,
  middle: [0, 0],
  bias: 0.5,
};
const paper = plain({ colour: (_u, _v, out) => out.fill(0.5) });

function board(scene: Scene, z: number, half: number): void {
  scene.lay({ cloth: paper, across: 40, along: 40 }, (u, v, p) => {
    p.x = (u - 0.5) * 2 * half;
    p.y = (0.5 - v) * 2 * half;
    p.z = z;
  });
}

describe('the studio light', () => {
  it('adds up to 1 for cloth that faces each lamp with nothing before it', () => {
    const key = studioRays(studio).filter(({ lamp }) => lamp === 'key');
    expect(key.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
    const facing: Vec3 = unit([0, 0.7, 0.7]);
    const fill = studioRays(studio).filter(({ lamp }) => lamp === 'fill');
    const got = fill.reduce(
      (sum, { towards: t, share }) =>
        sum + share * Math.max(0, t[0] * facing[0] + t[1] * facing[1] + t[2] * facing[2]),
      0,
    );
    expect(got).toBeCloseTo(1, 12);
  });

  it('does not depend on how many samples are taken', () => {
    const lit = (keySamples: number): number => {
      const scene = new Scene();
      board(scene, 0, 10);
      const seen = scene.sheets.map((sheet) => see(sheet, 0, 0));
      lightScene(seen, { ...studio, keySamples });
      return seen[0]!.key[20 * 40 + 20]!;
    };
    expect(lit(48)).toBeCloseTo(lit(12), 1);
    expect(lit(24)).toBeGreaterThan(0.9);
  });

  it('leaves cloth behind other cloth without key light', () => {
    const scene = new Scene();
    board(scene, 0, 5);
    board(scene, 12, 25);
    const seen = scene.sheets.map((sheet) => see(sheet, 0, 0));
    lightScene(seen, studio);
    expect(seen[0]!.key[20 * 40 + 20]).toBeLessThan(0.02);
    expect(seen[1]!.key[20 * 40 + 20]).toBeGreaterThan(0.9);
  });
});
