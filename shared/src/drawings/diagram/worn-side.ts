import type { WornSide } from '../../readings/worn-side.js';
import type { MeasuringLine, View, ViewersHand, ViewName } from './model.js';

/**
 * Where the wearer's right side lies, for somebody looking at the sheet.
 *
 * `front`: we face the wearer, so right is at our left. `back`: we stand behind, right is right. `inside`: opened
 * in front and laid with the lining up, or turned inside out with the back up, we look at the inside of the back,
 * which is as facing the wearer; a garment opened behind shows the inside of its front, and says so itself.
 * `below`: from beneath with the front at the top, the mirror image of looking down on one's own feet. `side`: one
 * of two.
 */
const usualHand: Readonly<Record<ViewName, ViewersHand>> = {
  front: 'left',
  back: 'right',
  inside: 'left',
  below: 'left',
  side: 'neither',
};

export const wearersRightIn = ({ name, wearersRight }: View): ViewersHand => wearersRight ?? usualHand[name];

/** Which side of the wearer a place of the view belongs to; undefined on the centre line and where neither is shown. */
export function wornSideAt(view: View, x: number): WornSide | undefined {
  const hand = wearersRightIn(view);
  if (hand === 'neither' || x === 0) return undefined;
  return (hand === 'left') === x < 0 ? 'right' : 'left';
}

/** The same line on the garment's other half; what ran left of it runs right. */
export const mirroredLine = (line: MeasuringLine): MeasuringLine => ({
  ...line,
  onOtherHalf: !line.onOtherHalf,
  beside: -line.beside,
});
