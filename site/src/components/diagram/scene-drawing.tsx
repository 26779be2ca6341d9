import type { Scene, SceneMark, ScenePoint } from '@ellwand/shared/drawings/diagram/scene';
import { classOfRole } from '@ellwand/shared/drawings/diagram/scene-to-svg';
import { TAPE_BREADTH, TapeMarks } from './tape';

interface SceneDrawingProps {
  readonly scene: Scene;
  /** The drawing's own scale, where a tape stands at its left. */
  readonly tapeMmPerPx: number | null;
}

/** Paints a scene. It is one picture to assistive technology: the table beside it says the same in words. */
export function SceneDrawing({ scene, tapeMmPerPx }: SceneDrawingProps) {
  const { width, height, title } = scene;
  const left = tapeMmPerPx === null ? 0 : TAPE_BREADTH;
  return (
    <svg
      className="drawing"
      role="img"
      width={left + width}
      height={height}
      viewBox={`${-left} 0 ${left + width} ${height}`}
    >
      <title>{title}</title>
      {tapeMmPerPx !== null && <TapeMarks upright lengthPx={height} mmPerPx={tapeMmPerPx} />}
      <SceneShapes scene={scene} />
    </svg>
  );
}

export function SceneShapes({ scene: { clips, primitives } }: { readonly scene: Scene }) {
  return (
    <>
      <defs>
        {clips.map(({ id, paths }) => (
          <clipPath key={id} id={id}>
            {paths.map((d, index) => (
              <path key={index} d={d} />
            ))}
          </clipPath>
        ))}
      </defs>
      {primitives.map((primitive, index) =>
        primitive.type === 'point' ? (
          <PointGroup key={index} point={primitive} />
        ) : (
          <Mark key={index} mark={primitive} />
        ),
      )}
    </>
  );
}

function PointGroup({ point: { pointId, marks } }: { readonly point: ScenePoint }) {
  return (
    <g className="drawing-point" data-point={pointId}>
      {marks.map((mark, index) => (
        <Mark key={index} mark={mark} />
      ))}
    </g>
  );
}

function Mark({ mark }: { readonly mark: SceneMark }) {
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
  // A whole line can draw along its length when chosen; a broken one already has its dashes.
  const pathLength = mark.role === 'line' && mark.dash === undefined ? 1 : undefined;
  const clipPath = mark.clip === undefined ? undefined : `url(#${mark.clip})`;
  const shape = { d: mark.d, strokeWidth, strokeDasharray: mark.dash, clipPath, pathLength };
  return <path className={className} {...shape} />;
}
