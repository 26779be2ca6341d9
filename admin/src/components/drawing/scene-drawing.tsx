import type { Scene, SceneMark, ScenePrimitive } from '@ellwand/shared/drawings/diagram/scene';
import type { ReactNode } from 'react';

interface Choosing {
  readonly current?: string;
  readonly onChoose?: (pointId: string) => void;
}

/**
 * Paints a scene. Its colours are classes, so that light and dark are the style sheet's; the table is its text. A
 * scene without a title stands beside its name and says nothing of its own.
 */
export function SceneDrawing({
  scene,
  className = '',
  children,
  ...choosing
}: {
  readonly scene: Scene;
  readonly className?: string;
  /** Drawn on top, in the scene's pixels. */
  readonly children?: ReactNode;
} & Choosing) {
  return (
    <svg
      viewBox={`0 0 ${scene.width} ${scene.height}`}
      {...(scene.title === '' ? { 'aria-hidden': true } : { role: 'img', 'aria-label': scene.title })}
      className={`drawing ${className}`}
    >
      {scene.title !== '' && <title>{scene.title}</title>}
      <defs>
        {scene.clips.map(({ id, paths }) => (
          <clipPath key={id} id={id}>
            {paths.map((d, index) => (
              <path key={index} d={d} />
            ))}
          </clipPath>
        ))}
      </defs>
      {scene.primitives.map((primitive, index) => (
        <Primitive key={index} primitive={primitive} {...choosing} />
      ))}
      {children}
    </svg>
  );
}

function Primitive({ primitive, current, onChoose }: { readonly primitive: ScenePrimitive } & Choosing) {
  if (primitive.type !== 'point') return <Mark mark={primitive} />;
  const { pointId } = primitive;
  // The rows beside it do the same from the keyboard.
  return (
    <g
      data-point={pointId}
      className={pointId === current ? 'drawing-point drawing-point-current' : 'drawing-point'}
      onClick={() => onChoose?.(pointId)}
    >
      {primitive.marks.map((mark, index) => (
        <Mark key={index} mark={mark} />
      ))}
    </g>
  );
}

function Mark({ mark }: { readonly mark: SceneMark }) {
  const className = `drawing-${mark.role}`;
  if (mark.type === 'text') {
    return (
      <text className={className} x={mark.x} y={mark.y} fontSize={mark.size} textAnchor="middle">
        {mark.text}
      </text>
    );
  }
  const strokeWidth = mark.strokeWidth || undefined;
  if (mark.type === 'circle')
    return <circle className={className} cx={mark.cx} cy={mark.cy} r={mark.r} strokeWidth={strokeWidth} />;
  const clipPath = mark.clip && `url(#${mark.clip})`;
  return (
    <path
      className={className}
      d={mark.d}
      strokeWidth={strokeWidth}
      strokeDasharray={mark.dash}
      clipPath={clipPath}
      pathLength={mark.role === 'line-current' && !mark.dash ? 1 : undefined}
    />
  );
}
