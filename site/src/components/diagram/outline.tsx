import { useDrawings } from './drawings';
import { LeftAsDrawn } from './left-as-drawn';
import type { OutlineShapesProps } from './outline-shapes';

/** A kind of garment in outline; its name stands beside it, so that it is hidden from assistive technology. */
export function Outline(props: OutlineShapesProps) {
  const { Outline: Shapes } = useDrawings();
  return (
    <LeftAsDrawn key={props.kind} className="kind-outline" aria-hidden="true">
      <Shapes {...props} />
    </LeftAsDrawn>
  );
}
