import { type Scene, type SceneMark, type ScenePoint, type ScenePrimitive } from '@ellwand/shared/drawings/diagram/scene';
import { classOfRole } from '@ellwand/shared/drawings/diagram/scene-to-svg';
import { memo } from 'react';
import { type LitPoints } from './lit-points';

interface SceneDrawingProps {
  readonly scene: Scene;
  readonly lit: LitPoints;
}

/** Paints a scene. It is one picture to assistive technology: the table beside it says the same in words. */
export function SceneDrawing({ scene, lit }: SceneDrawingProps) {
  const { width, height, title, primitives } = scene;
  return (
    <svg
      className="drawing"
      role="img"
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      data-lit={lit.lit ?? undefined}
    >
      <title>{title}</title>
      <SceneShapes scene={scene} />
      {primitives.filter(isPoint).map((point, index) => (
        <PointGroup key={index} point={point} lit={lit} />
      ))}
    </svg>
  );
}

/** The garment itself: what stays the same whatever is pointed at. Measuring lines lie on top of all of it. */
export const SceneShapes = memo(function SceneShapes({ scene }: { readonly scene: Scene }) {
  return (
    <>
      <defs>
        {scene.clips.map(({ id, paths }) => (
          <clipPath key={id} id={id}>
            {paths.map((d, index) => (
              <path key={index} d={d} />
            ))}
          </clipPath>
        ))}
      </defs>
      {scene.primitives.map((primitive, index) =>
        isPoint(primitive) ? null : <Mark key={index} mark={primitive} />,
      )}
    </>
  );
});

const isPoint = (primitive: ScenePrimitive): primitive is ScenePoint => primitive.type === 'point';

function PointGroup({ point, lit }: { readonly point: ScenePoint; readonly lit: LitPoints }) {
  const { pointId, marks } = point;
  return (
    <g
      className="drawing-point"
      data-point={pointId}
      data-lit={lit.lit === pointId ? '' : undefined}
      data-chosen={lit.chosen === pointId ? '' : undefined}
      onPointerEnter={() => lit.light(pointId)}
      onPointerLeave={() => lit.light(null)}
      onClick={() => lit.chooseLine(pointId)}
    >
      {marks.map((mark, index) => (
        <Mark key={index} mark={mark} />
      ))}
    </g>
  );
}

const Mark = memo(function Mark({ mark }: { readonly mark: SceneMark }) {
  const className = classOfRole(mark.role);
  if (mark.type === 'text') {
    return (
      <text className={className} x={mark.x} y={mark.y} fontSize={mark.size}>
        {mark.text}
      </text>
    );
  }
  const strokeWidth = mark.strokeWidth || undefined;
  if (mark.type === 'circle') {
    return <circle className={className} cx={mark.cx} cy={mark.cy} r={mark.r} strokeWidth={strokeWidth} />;
  }
  return (
    <path
      className={className}
      d={mark.d}
      strokeWidth={strokeWidth}
      strokeDasharray={mark.dash}
      clipPath={mark.clip === undefined ? undefined : `url(#${mark.clip})`}
      pathLength={mark.role === 'line' && mark.dash === undefined ? 1 : undefined}
    />
  );
});
