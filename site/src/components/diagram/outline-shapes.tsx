import { paintSilhouette } from '@ellwand/shared/drawings/silhouettes/silhouette-for';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { SceneShapes } from './scene-drawing';

export interface OutlineShapesProps {
  readonly kind: GarmentKind;
  /** The same for all kinds on a page, so that they stand at one scale. */
  readonly pxPerMm: number;
}

export default function OutlineShapes({ kind, pxPerMm }: OutlineShapesProps) {
  const scene = paintSilhouette({ kind, pxPerMm });
  const { width, height } = scene;
  return (
    <svg className="drawing" width={width} height={height} viewBox={`0 0 ${width} ${height}`}>
      <SceneShapes scene={scene} />
    </svg>
  );
}
