import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';

export const levelNotSaid = sheetCheck({
  id: 'level-not-said',
  title: 'Level not said',
  about: 'A bust, waist or hip without a word on how its level was found.',
  severity: 'note',
  messages: { unsaid: 'How the level was found is not said: {points}.' },
  run: (sheet, raise) => {
    const listed = readPoints(sheet)
      .filter(({ point, readings }) => point.levelRecorded && !readings.some((one) => one.levelFoundBy))
      .map(({ accepted }) => accepted);
    if (listed.length > 0) raise('unsaid', { points: { listed } });
  },
});
