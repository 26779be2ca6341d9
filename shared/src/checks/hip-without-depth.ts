import { sheetCheck } from './check.js';

export const hipWithoutDepth = sheetCheck({
  id: 'hip-without-depth',
  title: 'Hip without its depth',
  about: 'A hip that does not say how far below the waist it was read.',
  severity: 'question',
  messages: { unsaid: 'The hip, {hip}, does not say how far below the waist it was read.' },
  run: ({ taken, values }, raise) => {
    const hip = values.get('hip');
    if (!hip) return;
    const isSaid = taken.some(({ pointId, depthBelowWaist }) => pointId === 'hip' && depthBelowWaist);
    if (!isSaid) raise('unsaid', { hip });
  },
});
