import type { Anchors } from '../geometry/path-language.js';
import type { GarmentKind } from '../../points/kinds.js';
import type { Point } from '../geometry/point.js';

/** How the garment lies while these lines are read. */
export type ViewName = 'front' | 'back' | 'inside' | 'side' | 'below';

/**
 * What a layer is: `cloth` and `lining` are filled shapes (outside and inside of the garment), `piece` a filled
 * shape lying on one of them (a collar, a band), `edge` a cut or folded edge, the rest are lines.
 */
export type LayerRole =
  'cloth' | 'lining' | 'piece' | 'piece-lining' | 'edge' | 'seam' | 'fold' | 'stitching';

/**
 * `joined`: the right half, closed by its own mirror image. `both`: drawn, and mirrored once more.
 * `once`: as written, for what closes right over left.
 */
export type Symmetry = 'joined' | 'both' | 'once';

/**
 * Where a line may be seen: on all the cloth painted so far, on the last shape painted, or everywhere.
 * Seams overshoot and are cut off here, so that every junction is clean.
 */
export type Within = 'cloth' | 'last' | 'all';

/** A shape or line of a view, in the path language; millimetres, x = 0 the centre, y down. */
export interface ShapeLayer {
  readonly role: LayerRole;
  readonly path: string;
  readonly symmetry: Symmetry;
  readonly within: Within;
}

/** Buttons or eyelets, their radius in millimetres. */
export interface ButtonLayer {
  readonly role: 'button';
  readonly at: readonly Point[];
  readonly radius: number;
  readonly symmetry: 'both' | 'once';
}

export type Layer = ShapeLayer | ButtonLayer;

/**
 * At which hand of somebody looking at the sheet the wearer's right side lies; `neither` where one shoe or glove
 * stands for both.
 */
export type ViewersHand = 'left' | 'right' | 'neither';

export interface View {
  readonly name: ViewName;
  /** Where the wearer's right side lies; left out: where it always lies in views of this name. */
  readonly wearersRight?: ViewersHand;
  /** Stands beneath the drawing. */
  readonly caption: string;
  readonly anchors: Anchors;
  /** In order of painting: what comes later hides what lies behind it. */
  readonly layers: readonly Layer[];
}

/**
 * How the tape goes: along a straight line, along the cloth's curve, round the opened garment from fastening
 * to fastening, or across the flat garment and doubled.
 */
export type MeasuringWay = 'straight' | 'curve' | 'round' | 'doubled';

export interface MeasuringLine {
  readonly pointId: string;
  readonly view: ViewName;
  readonly way: MeasuringWay;
  /** Paths over the view's anchors; between two of them the tape steps over to the next piece. */
  readonly stretches: readonly string[];
  /** Pixels to the left hand of its direction, so that a line may run beside an edge. */
  readonly beside: number;
  /** For a round: millimetres by which the tape sags in front; behind, it is drawn thin. */
  readonly sag: number;
  /** Drawn on the half of the view on which it is not written. */
  readonly onOtherHalf?: boolean;
}

export interface GarmentDiagram {
  readonly kind: GarmentKind;
  readonly title: string;
  readonly views: readonly View[];
  readonly lines: readonly MeasuringLine[];
  /** Pixels per millimetre below which two views do not stand side by side: letters would crowd. */
  readonly leastScale: number;
}

/** The view on which a point's line is drawn, or undefined where the kind has no line for it. */
export const viewOfPoint = (diagram: GarmentDiagram, pointId: string): ViewName | undefined =>
  diagram.lines.find((line) => line.pointId === pointId)?.view;
