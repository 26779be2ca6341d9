import { paintDiagram } from '@ellwand/shared/drawings/diagram/paint-diagram';
import { lettersFor, type Protocol } from '@ellwand/shared/protocols/protocol';
import { extraLinesOf } from '@ellwand/shared/protocols/extra-lines';
import { paintScene } from '../paper/paint-scene';
import { points } from '../paper/paper-size';
import type { SheetPaper } from '../paper/sheet-paper';
import { ink, styles } from '../paper/styles';

/** A CSS pixel is a 96th of an inch, a point a 72nd. */
const pointsPerPixel = 72 / 96;
const mostHeightPx = 380;

/** The kind's measuring diagram with the letters of the table; nothing where a kind is not drawn. */
export function drawDiagram(paper: SheetPaper, protocol: Protocol): void {
  const scene = paintDiagram({
    kind: protocol.kind,
    widthPx: Math.floor(paper.width / pointsPerPixel),
    mostHeightPx,
    letters: lettersFor(protocol),
    ownLines: extraLinesOf(protocol.ownPoints),
  });
  if (!scene) return;
  const height = scene.height * pointsPerPixel;
  paper.room(height + points(5));
  const x = paper.edge + (paper.width - scene.width * pointsPerPixel) / 2;
  const { y } = paper;
  paper.tag('Figure', () => paintScene(paper.doc, scene, { x, y, scale: pointsPerPixel }), {
    alt: `${scene.title}. The letters are those of the table.`,
    bbox: [x, y, x + scene.width * pointsPerPixel, y + height],
  });
  paper.y += height + points(2);
  const words =
    'Solid line: read from end to end. Broken line: the half, doubled. Double ring: all round. Left and right are the wearer’s.';
  paper.block('P', words, styles.small, { after: points(3) });
}

/** A bar of 100 mm: whoever lays a tape or rule on it knows whether the print is true, and the tape too. */
export function drawBar(paper: SheetPaper): void {
  const length = points(100);
  paper.room(points(13));
  const { edge: x, y } = paper;
  paper.ornament((doc) => {
    doc.lineWidth(0.75).strokeColor(ink);
    doc.moveTo(x, y + points(3)).lineTo(x + length, y + points(3));
    for (let centimetre = 0; centimetre <= 10; centimetre += 1) {
      const at = x + points(10 * centimetre);
      doc.moveTo(at, y + points(centimetre % 5 === 0 ? 0 : 1.2)).lineTo(at, y + points(3));
    }
    doc.stroke();
  });
  const words =
    'This bar is 100 mm. Lay the tape on it: where they differ, the page was printed smaller or larger, or the tape is out.';
  paper.tag('P', () =>
    paper.set(words, styles.small, { x: x + length + points(5), y, width: paper.width - length - points(5) }),
  );
  paper.y += points(13);
}
