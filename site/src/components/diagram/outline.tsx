import { paintSilhouette } from '@ellwand/shared/drawings/silhouettes/silhouette-for';
import { type GarmentKind } from '@ellwand/shared/points/kinds';
import { memo } from 'react';
import { SceneShapes } from './scene-drawing';

interface OutlineProps {
  readonly kind: GarmentKind;
  /** The same for all kinds on a page, so that they stand at one scale. */
  readonly pxPerMm: number;
}

/** A kind of garment in outline; its name stands beside it, so that it is hidden from assistive technology. */
export const Outline = memo(function Outline({ kind, pxPerMm }: OutlineProps) {
  const scene = paintSilhouette({ kind, pxPerMm });
  return (
    <svg
      className="drawing outline"
      width={scene.width}
      height={scene.height}
      viewBox={`0 0 ${scene.width} ${scene.height}`}
      aria-hidden="true"
    >
      <SceneShapes scene={scene} />
    </svg>
  );
});
