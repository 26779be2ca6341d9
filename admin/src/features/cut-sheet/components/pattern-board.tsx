import type { PixelMark } from '@ellwand/shared/cut-sheet/pattern-scale';
import { type KeyboardEvent, type MouseEvent, type RefObject, useEffect, useRef, useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { type MarkName, type NamedMark, nudged } from '../model/marks.js';

interface PatternBoardProps {
  readonly src: string;
  /** What the picture shows, for whoever does not see it. */
  readonly alt: string;
  /** Width and height of the original in pixels. */
  readonly size: PixelMark;
  readonly marks: readonly NamedMark[];
  /** The mark that the next tap sets. */
  readonly chosen: MarkName;
  readonly disabled: boolean;
  readonly onChoose: (name: MarkName) => void;
  readonly onTap: (at: PixelMark) => void;
  readonly onMove: (name: MarkName, at: PixelMark) => void;
}

const closest = 8;
/** The frame's share of the window's height, as its class says it. */
const FRAME_HEIGHT = 0.7;
/** CSS pixels: half the crossing of a mark, and the size of its letter. */
const ARM = 11;
const LETTER = 15;

/**
 * The picture of a hand-drawn pattern with its marks. A tap sets the chosen mark; a mark that has the focus goes a pixel
 * with an arrow key, ten with Shift. Closer views scroll within their frame.
 */
export function PatternBoard(props: PatternBoardProps) {
  const { src, alt, size, marks, chosen, disabled, onTap } = props;
  const frame = useRef<HTMLDivElement>(null);
  const [zoom, setZoom] = useState(1);
  const whole = useWholeWidth(frame, size);
  const perCssPixel = size.x / (whole * zoom);
  const closer = (next: number) => {
    const view = frame.current;
    if (view) requestAnimationFrame(() => keepMiddle(view, next / zoom));
    setZoom(next);
  };
  const tapped = (event: MouseEvent<SVGSVGElement>) => {
    if (disabled) return;
    const box = event.currentTarget.getBoundingClientRect();
    const at = (place: number, start: number, extent: number, pixels: number) =>
      Math.round(((place - start) / extent) * pixels);
    onTap(
      nudged(
        {
          x: at(event.clientX, box.left, box.width, size.x),
          y: at(event.clientY, box.top, box.height, size.y),
        },
        0,
        0,
        size,
      ),
    );
  };
  return (
    <div>
      <div className="mb-2 flex flex-wrap items-center gap-2">
        <Button height="table" disabled={zoom === closest} onClick={() => closer(zoom * 2)}>
          Closer
        </Button>
        <Button height="table" disabled={zoom === 1} onClick={() => closer(zoom / 2)}>
          Further
        </Button>
        <p className="figures text-label text-ink-2">{zoom === 1 ? 'Whole picture' : `${zoom} × closer`}</p>
      </div>
      <div
        ref={frame}
        tabIndex={0}
        role="region"
        aria-label="Picture of the pattern"
        className="max-h-[70vh] overflow-auto border border-rule bg-well"
      >
        <svg
          viewBox={`0 0 ${size.x} ${size.y}`}
          width={whole * zoom}
          className={`mx-auto block ${disabled ? '' : 'cursor-crosshair'}`}
          onClick={tapped}
        >
          <image href={src} width={size.x} height={size.y}>
            <title>{alt}</title>
          </image>
          <Lines marks={marks} />
          {marks.map((mark) => (
            <BoardMark
              key={mark.name}
              {...props}
              mark={mark}
              isChosen={mark.name === chosen}
              perCssPixel={perCssPixel}
            />
          ))}
        </svg>
      </div>
    </div>
  );
}

/** How wide the picture stands, in CSS pixels, where all of it is to be seen at once. */
function useWholeWidth(frame: RefObject<HTMLDivElement | null>, size: PixelMark): number {
  const [wide, setWide] = useState(640);
  useEffect(() => {
    const view = frame.current;
    if (!view) return;
    const watch = new ResizeObserver(() => setWide(view.clientWidth || 640));
    watch.observe(view);
    return () => watch.disconnect();
  }, [frame]);
  const high = window.innerHeight * FRAME_HEIGHT;
  return Math.max(1, Math.floor(Math.min(wide, (high * size.x) / size.y)));
}

/** What stood in the middle of the frame stands there again after the picture has grown. */
function keepMiddle(view: HTMLElement, grown: number): void {
  const middle = (start: number, extent: number) => (start + extent / 2) * grown - extent / 2;
  view.scrollTo(middle(view.scrollLeft, view.clientWidth), middle(view.scrollTop, view.clientHeight));
}

/** A line for each pair of which both marks are set: the scale's solid, what is read by it broken. */
function Lines({ marks }: { readonly marks: readonly NamedMark[] }) {
  const pairs = marks.flatMap((mark, index) => {
    const other = marks[index + 1];
    return index % 2 === 0 && mark.at && other?.at ? [{ name: mark.name, from: mark.at, to: other.at }] : [];
  });
  return pairs.map(({ name, from, to }) => (
    <line
      key={name}
      x1={from.x}
      y1={from.y}
      x2={to.x}
      y2={to.y}
      className="stroke-madder"
      strokeWidth={2}
      strokeDasharray={name === 'marks.from' ? undefined : '6 4'}
      vectorEffect="non-scaling-stroke"
    />
  ));
}

const steps: Readonly<Record<string, readonly [across: number, down: number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

interface BoardMarkProps extends PatternBoardProps {
  readonly mark: NamedMark;
  readonly isChosen: boolean;
  /** Pixels of the original in a CSS pixel, so that marks keep their size on the screen. */
  readonly perCssPixel: number;
}

function BoardMark({ mark, isChosen, perCssPixel, size, disabled, onChoose, onMove }: BoardMarkProps) {
  const { name, letter, at } = mark;
  if (!at) return null;
  const arm = ARM * perCssPixel;
  const pressed = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (!step || disabled) return;
    event.preventDefault();
    const far = event.shiftKey ? 10 : 1;
    onMove(name, nudged(at, step[0] * far, step[1] * far, size));
  };
  return (
    <g
      tabIndex={disabled ? undefined : 0}
      role="button"
      aria-pressed={isChosen}
      aria-label={`Mark ${letter}, ${at.x} across, ${at.y} down. Arrow keys move it.`}
      className="group outline-none"
      onKeyDown={pressed}
      onFocus={() => onChoose(name)}
    >
      {/* The ring of the focus, light around dark, so that it is seen on any picture. */}
      {['stroke-sheet', 'stroke-indigo'].map((stroke, layer) => (
        <circle
          key={stroke}
          cx={at.x}
          cy={at.y}
          r={arm * 1.5}
          className={`hidden fill-none group-focus-visible:block ${stroke}`}
          strokeWidth={layer === 0 ? 7 : 3}
          vectorEffect="non-scaling-stroke"
        />
      ))}
      <circle cx={at.x} cy={at.y} r={arm} className={isChosen ? 'fill-weld/40' : 'fill-sheet/50'} />
      <path
        d={`M${at.x - arm} ${at.y}h${2 * arm}M${at.x} ${at.y - arm}v${2 * arm}`}
        className="fill-none stroke-madder"
        strokeWidth={isChosen ? 2 : 1.5}
        vectorEffect="non-scaling-stroke"
      />
      <text
        x={at.x + arm * 0.5}
        y={at.y - arm * 0.6}
        fontSize={LETTER * perCssPixel}
        strokeWidth={3.5 * perCssPixel}
        className="fill-madder stroke-sheet font-semibold"
        paintOrder="stroke"
      >
        {letter}
      </text>
    </g>
  );
}
