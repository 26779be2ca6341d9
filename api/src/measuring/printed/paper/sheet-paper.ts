import PDFDocument from 'pdfkit';
import { type Face, inOneLine, runsOf } from './faces';
import { margin, type Paper, points, sidesOf } from './paper-size';
import { rule, type Style, styles } from './styles';

export interface PaperRequest {
  readonly paper: Paper;
  /** For the reader's window and for whoever hears the file read out. */
  readonly title: string;
  /** At the foot of every page, before its number: a page that goes astray says what it belongs to. */
  readonly foot: string;
  readonly madeAt: Date;
  readonly faces: ReadonlyMap<Face, Buffer>;
}

export interface TextPlace {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly align?: 'left' | 'right' | 'center';
}

/** What is said of a thing under its name; pdfkit takes more than its types tell. */
interface Naming {
  /** What a picture shows, in words. */
  readonly alt?: string;
  /** Left, top, right, bottom of a picture on its page. */
  readonly bbox?: readonly [number, number, number, number];
  readonly scope?: 'Column' | 'Row';
}

const footRoom = points(9);

/**
 * The pages of a printed sheet, from top to bottom: text, rules and drawings, each named for what it is, so that the
 * file can be read aloud in order. Lengths are points, from the page's upper left corner.
 */
export class SheetPaper {
  readonly doc: PDFKit.PDFDocument;
  readonly edge = margin;
  readonly width: number;
  /** Where the next block begins. */
  y = margin;
  private readonly bottom: number;
  private readonly chunks: Buffer[] = [];
  private readonly root: PDFKit.PDFStructureElement;
  private within: PDFKit.PDFStructureElement;

  constructor(private readonly request: PaperRequest) {
    const { width, height } = sidesOf[request.paper];
    this.width = width - 2 * margin;
    this.bottom = height - margin - footRoom;
    this.doc = new PDFDocument({
      size: [width, height],
      margin: 0,
      bufferPages: true,
      tagged: true,
      lang: 'en-GB',
      displayTitle: true,
      pdfVersion: '1.7',
      info: { Title: request.title, Creator: 'Ellwand', CreationDate: request.madeAt },
    });
    this.doc.on('data', (chunk: Buffer) => this.chunks.push(chunk));
    for (const [face, file] of request.faces) this.doc.registerFont(face, file);
    this.root = this.doc.struct('Document');
    this.doc.addStructure(this.root);
    this.within = this.root;
  }

  get right(): number {
    return this.edge + this.width;
  }

  /** Begins a new page where less than this is left on this one. Returns whether it did. */
  room(height: number): boolean {
    if (this.y + height <= this.bottom || this.y === margin) return false;
    this.doc.addPage();
    this.y = margin;
    return true;
  }

  /** How much is left on this page. */
  get roomLeft(): number {
    return this.bottom - this.y;
  }

  /** Whatever is drawn inside belongs together under one name: a section, a table, a row. */
  group(type: string, draw: () => void, options: Naming = {}): void {
    const outer = this.within;
    const element = this.doc.struct(type, options);
    outer.add(element);
    this.within = element;
    draw();
    element.end();
    this.within = outer;
  }

  /** Draws one thing under its name. It must stay on one page. */
  tag(type: string, draw: () => void, options: Naming = {}): void {
    this.within.add(this.doc.struct(type, options, draw));
  }

  /** Draws what only the eye needs: rules, boxes, a number of pages. */
  ornament(draw: (doc: PDFKit.PDFDocument) => void): void {
    this.doc.markContent('Artifact', { type: 'Layout' });
    this.doc.save();
    draw(this.doc);
    this.doc.restore();
    this.doc.endMarkedContent();
  }

  hairline(y: number, from = this.edge, to = this.right, colour = rule): void {
    this.ornament((doc) => doc.lineWidth(0.5).strokeColor(colour).moveTo(from, y).lineTo(to, y).stroke());
  }

  heightOf(text: string, style: Style, width: number): number {
    if (text === '') return 0;
    return this.face(style).heightOfString(inOneLine(text), { width, lineGap: style.lead });
  }

  /** Sets text at a place, without a name: for inside of `tag`. */
  set(text: string, style: Style, { x, y, width, align = 'left' }: TextPlace): void {
    const runs = runsOf(text, style.weight);
    runs.forEach((run, index) => {
      const options: PDFKit.Mixins.TextOptions = {
        width,
        align,
        lineGap: style.lead,
        features: ['kern', 'tnum'],
        continued: index < runs.length - 1,
      };
      this.doc.font(run.face).fontSize(style.size).fillColor(style.colour);
      if (index === 0) this.doc.text(run.text, x, y, options);
      else this.doc.text(run.text, options);
    });
  }

  /** A paragraph or heading over the whole width, at the place where the sheet has come to. */
  block(type: string, text: string, style: Style, { after = 0, keep = 0 } = {}): void {
    const height = this.heightOf(text, style, this.width);
    this.room(height + keep);
    const { edge: x, y, width } = this;
    this.tag(type, () => this.set(text, style, { x, y, width }));
    this.y += height + after;
  }

  /** A heading, kept with at least a little of what it heads. */
  heading(text: string): void {
    this.y += points(5);
    this.block('H2', text, styles.heading, { after: points(1.5), keep: points(18) });
  }

  /** Numbers the pages and closes the file. */
  async finish(): Promise<Buffer> {
    const { start, count } = this.doc.bufferedPageRange();
    for (let page = start; page < start + count; page += 1) {
      this.doc.switchToPage(page);
      this.foot(`Page ${page + 1} of ${count}`);
    }
    this.root.end();
    const ended = new Promise<void>((resolve, reject) => {
      this.doc.once('end', resolve);
      this.doc.once('error', reject);
    });
    this.doc.end();
    await ended;
    return Buffer.concat(this.chunks);
  }

  private foot(number: string): void {
    const y = this.bottom + points(5);
    this.ornament(() => {
      this.set(this.request.foot, styles.foot, { x: this.edge, y, width: this.width - points(30) });
      this.set(number, styles.foot, { x: this.right - points(30), y, width: points(30), align: 'right' });
    });
  }

  private face({ weight, size }: Style): PDFKit.PDFDocument {
    return this.doc.font(weight === 'title' ? 'title' : `${weight}-latin`).fontSize(size);
  }
}
