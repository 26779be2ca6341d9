import { type ComponentType, lazy } from 'react';
import type { MeasuringSheetProps } from './measuring-sheet';
import type { OutlineShapesProps } from './outline-shapes';

/** What draws. */
export interface Drawings {
  readonly Sheet: ComponentType<MeasuringSheetProps>;
  readonly Outline: ComponentType<OutlineShapesProps>;
}

let drawings: Drawings = {
  Sheet: lazy(() => import('./measuring-sheet')),
  Outline: lazy(() => import('./outline-shapes')),
};

/** The server hands in what draws at once; the browser loads it only for a page that it draws itself. */
export function provideDrawings(provided: Drawings): void {
  drawings = provided;
}

export function useDrawings(): Drawings {
  return drawings;
}
