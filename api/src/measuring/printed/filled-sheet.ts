import { kindLabels } from '@ellwand/shared/points/kinds';
import { toProtocol } from '@ellwand/shared/records/protocol';
import type { Sheet, SheetFindings } from '@ellwand/shared/records/sheet';
import type { Print } from './blank-sheet';
import { drawDerived, drawFindings, drawNoted } from './blocks/conclusions';
import { drawBar, drawDiagram } from './blocks/diagram';
import { drawFilledFacts } from './blocks/filled-facts';
import { drawFilledTable } from './blocks/filled-table';
import type { GarmentOnPaper } from './blocks/garment-on-paper';
import { drawHeading } from './blocks/heading';
import { dayOnPaper, momentOnPaper } from './blocks/moment-on-paper';
import { SheetPaper } from './paper/sheet-paper';

export interface FilledSheet {
  readonly museum: string;
  readonly sheet: Sheet;
  readonly findings: SheetFindings;
  readonly garment: GarmentOnPaper;
}

/** A sheet as it stands, whole: readings as they were keyed, values, what follows from them, findings and answers. */
export function printFilled(
  { museum, sheet, findings, garment }: FilledSheet,
  print: Print,
): Promise<Buffer> {
  const what = sheet.wornTogether ? 'parts laid together as worn' : kindLabels[sheet.kind].singular;
  const title = `Measuring sheet: ${what.toLowerCase()}`;
  const day = dayOnPaper(sheet.facts.measuredOn);
  const printed = `printed ${momentOnPaper(print.madeAt)}`;
  const paper = new SheetPaper({
    ...print,
    title: `${garment.number}, measuring sheet of ${day}`,
    foot: [museum, garment.number, `measured ${day}`, printed].join(' · '),
  });
  const state = sheet.state === 'complete' ? 'Complete' : 'Not complete yet';
  const study =
    sheet.facts.purpose === 'study'
      ? ' A study of how readings repeat: it does not speak for the garment.'
      : '';
  const lead = `${state}. Points, version ${sheet.protocolVersion}. Measured along the garment as fastened; not the wearer’s body.${study}`;
  drawHeading(paper, { museum, title, garment, lead });
  drawFilledFacts(paper, sheet);
  drawDiagram(paper, toProtocol(sheet.protocol));
  drawBar(paper);
  drawFilledTable(paper, sheet);
  drawDerived(paper, findings.derived);
  drawFindings(paper, findings.findings);
  drawNoted(paper, sheet);
  return paper.finish();
}
