import { create } from 'qrcode';
import { points } from '../paper/paper-size';
import type { SheetPaper } from '../paper/sheet-paper';
import { ink, styles } from '../paper/styles';
import type { GarmentOnPaper } from './garment-on-paper';

export interface Heading {
  readonly museum: string;
  readonly title: string;
  /** Null on a blank sheet for whichever garment comes: its number is then written by hand. */
  readonly garment: GarmentOnPaper | null;
  /** One line beneath: by which points, in which state. */
  readonly lead: string;
}

const square = points(25);

/** What the sheet is and which garment it belongs to, with the square that leads there. */
export function drawHeading(paper: SheetPaper, { museum, title, garment, lead }: Heading): void {
  const width = paper.width - (garment ? square + points(6) : 0);
  const top = paper.y;
  const line = (type: string, text: string, style: (typeof styles)[keyof typeof styles], after: number) => {
    const { edge: x, y } = paper;
    paper.tag(type, () => paper.set(text, style, { x, y, width }));
    paper.y += paper.heightOf(text, style, width) + after;
  };
  line('P', museum, styles.label, points(1));
  line('H1', title, styles.title, points(0.5));
  if (garment) {
    line('P', `${garment.number}  ${garment.title}`, styles.figure, points(1));
    const facts = [garment.part, garment.date, garment.maker].filter((fact) => fact);
    line('P', facts.join(' · '), styles.body, points(1));
  }
  line('P', lead, styles.small, points(1));
  // The address for whoever has no camera, beside the square.
  if (garment) {
    line('P', garment.link, styles.small, points(1));
    drawSquare(paper, garment.link, top);
  }
  paper.y = Math.max(paper.y, garment ? top + square : 0) + points(2);
  paper.hairline(paper.y, paper.edge, paper.right, ink);
  paper.y += points(3);
}

/** The address as squares, drawn, so that it stays sharp. */
function drawSquare(paper: SheetPaper, link: string, y: number): void {
  const { modules } = create(link, { errorCorrectionLevel: 'M' });
  const step = square / modules.size;
  const x = paper.right - square;
  const dots = [...modules.data].flatMap((dark, at) =>
    dark ? [[x + (at % modules.size) * step, y + Math.floor(at / modules.size) * step] as const] : [],
  );
  paper.tag(
    'Figure',
    () => {
      // A trifle larger than a step, or hairs of white would stand between the squares.
      for (const [left, top] of dots) paper.doc.rect(left, top, step + 0.05, step + 0.05);
      paper.doc.fill(ink);
    },
    { alt: `QR code of the garment in the Workroom: ${link}`, bbox: [x, y, x + square, y + square] },
  );
}
