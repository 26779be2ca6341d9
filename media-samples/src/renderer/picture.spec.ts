import { describe, expect, it } from 'vitest';
import { dye, plain, colourOf } from '../cloths/cloth';
import { takePicture, type Shot } from './picture';
import { Scene } from './scene';

const shot: Shot = {
  camera: { yaw: 0, pitch: 5, distance: 400, lookAt: [0, 10], span: 40, aspect: 1 },
  backdrop: 'floor',
  reach: 30,
};

function ball(): Scene {
  const scene = new Scene();
  scene.lay(
    { cloth: plain({ colour: colourOf(dye('#803030')) }), across: 80, along: 60, closed: true },
    (u, v, p) => {
      const a = u * 2 * Math.PI;
      const b = v * Math.PI;
      p.x = 9 * Math.sin(b) * Math.sin(a);
      p.y = 10 + 9 * Math.cos(b);
      p.z = 9 * Math.sin(b) * Math.cos(a);
      p.u = u;
      p.v = v;
    },
  );
  return scene;
}

const pixels = (): Promise<Buffer> =>
  takePicture(ball(), shot, { widthPx: 120, heightPx: 120, oversample: 1.4 }).raw().toBuffer();
const at = (buffer: Buffer, x: number, y: number): number[] => [
  ...buffer.subarray((y * 120 + x) * 3, (y * 120 + x) * 3 + 3),
];

describe('takePicture', () => {
  it('takes the same picture twice', async () => {
    expect((await pixels()).equals(await pixels())).toBe(true);
  });

  it('shows the cloth in its own colour, lit from the upper left, before a grey board', async () => {
    const buffer = await pixels();
    const [red, green] = at(buffer, 60, 60);
    expect(red).toBeGreaterThan(green! * 1.6);
    const lit = at(buffer, 46, 46)[0]!;
    const shaded = at(buffer, 76, 76)[0]!;
    expect(lit).toBeGreaterThan(shaded + 30);
    const board = at(buffer, 5, 5);
    expect(Math.max(...board) - Math.min(...board)).toBeLessThan(12);
    expect(board[0]).toBeGreaterThan(200);
  });

  it('draws the shadow it stands in', async () => {
    const buffer = await pixels();
    // Just under the ball, and level with it at the edge of the picture.
    expect(at(buffer, 60, 89)[1]).toBeLessThan(at(buffer, 6, 89)[1]! - 10);
  });
});
