import { describe, expect, it } from 'vitest';
import { Scene } from '../renderer/scene';
import { pictureFiles } from '../commands/picture-list';
import { garments } from './registry';

/** Coarse meshes: the shapes are the same, and the walk takes seconds. */
const COARSE = 0.12;

describe('the garments', () => {
  it('are twenty-four, each with its own number', () => {
    expect(new Set(garments.map(({ number }) => number)).size).toBe(24);
  });

  it.each(garments.map((garment) => [garment.number, garment] as const))(
    '%s is made of real places only',
    (_number, garment) => {
      const scene = new Scene(COARSE);
      garment.build(scene);
      expect(scene.sheets.length).toBeGreaterThan(3);
      for (const sheet of scene.sheets) {
        expect(sheet.place.every((x) => Number.isFinite(x) && Math.abs(x) < 400)).toBe(true);
        expect(sheet.onCloth.every((x) => Number.isFinite(x))).toBe(true);
      }
    },
  );

  it('are made alike every time: folds come from a seed', () => {
    const places = (): Float32Array[] => {
      const scene = new Scene(COARSE);
      garments[0]!.build(scene);
      return scene.sheets.map(({ place }) => place);
    };
    expect(places()).toEqual(places());
  });

  it('are no two of one model: the meshes of any two differ', () => {
    const prints = garments.map((garment) => {
      const scene = new Scene(COARSE);
      garment.build(scene);
      return scene.sheets
        .map(({ place }) => place.reduce((sum, x, i) => sum + x * ((i % 7) + 1), 0).toFixed(2))
        .join(' ');
    });
    expect(new Set(prints).size).toBe(garments.length);
  });
});

describe('the pictures', () => {
  const files = pictureFiles(garments);

  it('have file names of their own', () => {
    expect(new Set(files.map(({ name }) => name)).size).toBe(files.length);
    expect(files.map(({ name }) => name)).toContain('lh-1966-30-front.jpg');
  });

  it('each say in the caption that they are rendered, and in a sentence what they show', () => {
    for (const { picture } of files) {
      expect(picture.caption.endsWith('Rendered; invented garment.')).toBe(true);
      expect(picture.alt).toMatch(/^[A-Z].{30,}\.$/);
    }
  });

  it('show every garment whole, and the five of greatest interest from behind', () => {
    for (const { number, pictures } of garments)
      expect(
        pictures.some(({ view }) => view === 'front' || view === 'side'),
        number,
      ).toBe(true);
    const behind = garments
      .filter(({ pictures }) => pictures.some(({ view }) => view === 'back'))
      .map(({ number }) => number);
    expect(behind).toEqual(
      expect.arrayContaining(['LH.1962.8', 'LH.1966.30', 'LH.1983.5', 'LH.1944.1', 'LH.1987.19']),
    );
  });
});
