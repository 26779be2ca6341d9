import { kindLabels } from '@ellwand/shared/points/kinds';
import type { Protocol } from '@ellwand/shared/protocols/protocol';
import { drawBlankFacts } from './blocks/blank-facts';
import { drawBlankNotes, drawBlankTable } from './blocks/blank-table';
import { drawCautions } from './blocks/cautions';
import { drawBar, drawDiagram } from './blocks/diagram';
import type { GarmentOnPaper } from './blocks/garment-on-paper';
import { drawHeading } from './blocks/heading';
import type { Face } from './paper/faces';
import type { Paper } from './paper/paper-size';
import { SheetPaper } from './paper/sheet-paper';

export interface BlankSheet {
  readonly museum: string;
  readonly protocol: Protocol;
  readonly garment: GarmentOnPaper | null;
}

export interface Print {
  readonly paper: Paper;
  readonly faces: ReadonlyMap<Face, Buffer>;
  readonly madeAt: Date;
}

/** A sheet to write on by hand: PDF, its text selectable, its parts named, its typefaces within it. */
export function printBlank({ museum, protocol, garment }: BlankSheet, print: Print): Promise<Buffer> {
  const what = protocol.wornTogether ? 'parts laid together as worn' : kindLabels[protocol.kind].singular;
  const title = `Measuring sheet: ${what.toLowerCase()}`;
  const paper = new SheetPaper({
    ...print,
    title: garment ? `${garment.number}, ${title.toLowerCase()}` : title,
    foot: [museum, garment?.number, title, `points, version ${protocol.version}`]
      .filter((word) => word)
      .join(' · '),
  });
  const lead = `To be written on by hand. Points, version ${protocol.version}: ${protocol.points.length} of them, in handling order.`;
  drawHeading(paper, { museum, title, garment, lead });
  drawCautions(paper, garment);
  drawBlankFacts(paper, { garmentKnown: garment !== null });
  drawDiagram(paper, protocol);
  drawBar(paper);
  drawBlankTable(paper, protocol);
  drawBlankNotes(paper);
  return paper.finish();
}
