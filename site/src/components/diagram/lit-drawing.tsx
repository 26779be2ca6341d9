import { type SyntheticEvent, useEffect, useRef } from 'react';
import { useDrawings } from './drawings';
import { LeftAsDrawn } from './left-as-drawn';
import type { LitPoints } from './lit-points';
import type { MeasuringSheetProps } from './measuring-sheet';

interface LitDrawingProps {
  readonly sheet: MeasuringSheetProps;
  readonly lit: LitPoints;
  readonly className: string;
}

/** A drawing whose lines light with their rows. It marks the lines that are there, whoever drew them. */
export function LitDrawing({ sheet, lit, className }: LitDrawingProps) {
  const { Sheet } = useDrawings();
  const drawing = useRef<HTMLDivElement>(null);
  useEffect(() => {
    drawing.current?.querySelector('svg')?.toggleAttribute('data-lit', lit.lit !== null);
    for (const line of drawing.current?.querySelectorAll<SVGGElement>('[data-point]') ?? []) {
      line.toggleAttribute('data-lit', line.dataset.point === lit.lit);
      line.toggleAttribute('data-chosen', line.dataset.point === lit.chosen);
    }
  }, [lit.lit, lit.chosen]);
  return (
    <LeftAsDrawn
      key={`${sheet.kind} ${sheet.points.join(' ')}`}
      ref={drawing}
      className={className}
      onPointerOver={(event) => lit.light(pointAt(event))}
      onPointerLeave={() => lit.light(null)}
      onClick={(event) => {
        const pointId = pointAt(event);
        if (pointId !== null) lit.chooseLine(pointId);
      }}
    >
      <Sheet {...sheet} />
    </LeftAsDrawn>
  );
}

function pointAt({ target }: SyntheticEvent): string | null {
  const line = target instanceof Element ? target.closest<SVGGElement>('[data-point]') : null;
  return line?.dataset.point ?? null;
}
