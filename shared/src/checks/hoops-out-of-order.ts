import type { AcceptedValue } from '../readings/accepted-value.js';
import { isLonger } from '../units/length.js';
import { sheetCheck } from './check.js';

const fromTheTop = [
  'crinoline-top-hoop-round',
  'crinoline-middle-hoop-round',
  'crinoline-base-round',
] as const;

export const hoopsOutOfOrder = sheetCheck({
  id: 'hoops-out-of-order',
  title: 'Hoops out of order',
  about: 'A cage with a hoop that is larger than the one below it.',
  severity: 'question',
  messages: {
    larger:
      '{above}, {upper}, is larger than {below}, {lower}. Cages widen downwards: were the hoops exchanged?',
  },
  run: ({ values }, raise) => {
    const hoops = fromTheTop.flatMap((pointId) => values.get(pointId) ?? []);
    hoops.forEach((upper, index) => {
      const lower: AcceptedValue | undefined = hoops[index + 1];
      if (!lower || !isLonger(upper.value, lower.value)) return;
      const names = { above: { mentioned: upper.pointId }, below: { mentioned: lower.pointId } };
      raise('larger', { ...names, upper, lower });
    });
  },
});
