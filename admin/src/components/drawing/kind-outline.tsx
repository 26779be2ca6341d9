import { drawView } from '@ellwand/shared/drawings/diagram/view-shapes';
import { paintSilhouette, silhouetteFor } from '@ellwand/shared/drawings/silhouettes/silhouette-for';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { useMemo } from 'react';
import { SceneDrawing } from './scene-drawing.js';

const WIDTH = 60;
const HEIGHT = 76;

/** A kind's outline beside its name, as large as its place allows. */
export function KindOutline({
  kind,
  className = '',
}: {
  readonly kind: GarmentKind;
  readonly className?: string;
}) {
  const scene = useMemo(() => {
    const { left, right, top, bottom } = drawView(silhouetteFor(kind)).bounds;
    return paintSilhouette({ kind, pxPerMm: Math.min(WIDTH / (right - left), HEIGHT / (bottom - top)) });
  }, [kind]);
  return <SceneDrawing scene={scene} className={`h-20 w-16 shrink-0 ${className}`} />;
}
