import {
  hazardCautions,
  hazardLabels,
  isHazardId,
  standingLabels,
} from '@ellwand/shared/records/hazard-words';
import { points } from '../paper/paper-size';
import type { SheetPaper } from '../paper/sheet-paper';
import { madder, madderTint, type Style, styles } from '../paper/styles';
import type { GarmentOnPaper } from './garment-on-paper';

type Said = readonly { readonly style: Style; readonly text: string }[];

/** Common practice of the trade, no source. */
const always = [
  'Read the garment’s hazards and handling notes first. Clean, dry hands, or gloves where a hazard asks for them.',
  'Two people turn and open it. Support all of its weight; never lift it by the shoulders or straps.',
  'Never pull the tape tight, force a fastening, or put the garment on a figure to measure it.',
  'Stop where damage is seen, and tell a conservator. A point left out, with its reason, is a good answer.',
  'Your institution’s and country’s rules come first; where in doubt, ask a qualified person.',
];

/** The usual cautions, before anything is asked to be done. */
export function drawCautions(paper: SheetPaper, garment: GarmentOnPaper | null): void {
  const said: Said = [
    { style: styles.warning, text: 'Before the box is opened' },
    ...(garment ? hazardsOf(garment) : []),
    ...always.map((text) => ({ style: styles.body, text: `• ${text}` })),
  ];
  const inset = points(3);
  const width = paper.width - 2 * inset;
  const heights = said.map(({ text, style }) => paper.heightOf(text, style, width) + points(0.6));
  const height = heights.reduce((sum, one) => sum + one, points(4));
  paper.room(height);
  const { edge, y } = paper;
  paper.ornament((doc) => {
    doc.rect(edge, y, paper.width, height).fill(madderTint);
    doc.rect(edge, y, points(1), height).fill(madder);
  });
  paper.y += points(2);
  paper.group('Sect', () =>
    said.forEach(({ text, style }, index) => {
      const place = { x: edge + inset, y: paper.y, width };
      paper.tag('P', () => paper.set(text, style, place));
      paper.y += heights[index] ?? 0;
    }),
  );
  paper.y = y + height + points(3);
}

function hazardsOf({ hazards, handling }: GarmentOnPaper): Said {
  const present = hazards.filter(({ standing }) => standing !== 'tested-absent');
  return [
    ...present.flatMap(({ id, standing, note }): Said => {
      const words = isHazardId(id) ? [hazardLabels[id], hazardCautions[id]] : [id, ''];
      const how = standingLabels[standing as keyof typeof standingLabels] ?? standing;
      return [
        { style: styles.strong, text: `${words[0]}: ${how.toLowerCase()}` },
        { style: styles.body, text: [words[1], note].filter((text) => text !== '').join(' ') },
      ].filter(({ text }) => text !== '');
    }),
    ...(handling.trim() === '' ? [] : [{ style: styles.body, text: `Handling: ${handling.trim()}` }]),
  ];
}
