import { howTaken } from '../readings/accepted-value.js';
import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';

export const doubledOverTissue = sheetCheck({
  id: 'doubled-over-tissue',
  title: 'Flat and doubled over tissue',
  about:
    'Points read flat and doubled while tissue lay inside, unless their note says what was done about it.',
  severity: 'question',
  messages: {
    over: 'Tissue lay inside, and a reading doubled over it comes out wrong: {points}. Was it taken out first?',
  },
  run: (sheet, raise) => {
    if (sheet.support !== 'flat-tissue') return;
    const { ownPoints } = sheet.protocol;
    const listed = readPoints(sheet)
      .filter(
        ({ readings }) =>
          readings.some((one) => howTaken(one, ownPoints) === 'flat-doubled') &&
          !readings.some(({ note = '' }) => /tissue/i.test(note)),
      )
      .map(({ accepted }) => accepted);
    if (listed.length > 0) raise('over', { points: { listed } });
  },
});
