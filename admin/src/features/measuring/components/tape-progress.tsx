/** Ticks along the tape: long at ten, middle at five. The numbers are points done, so each tick is a point. */
export function TapeProgress({ done, wanted }: { readonly done: number; readonly wanted: number }) {
  const width = Math.max(1, wanted) * 10;
  return (
    <div className="min-w-40 grow">
      <p className="figures text-label text-ink-2" aria-hidden="true">
        {done} of {wanted} points
      </p>
      <div
        role="progressbar"
        aria-label="Points done"
        aria-valuenow={done}
        aria-valuemin={0}
        aria-valuemax={wanted}
        aria-valuetext={`${done} of ${wanted} points`}
      >
        <svg
          viewBox={`0 0 ${width} 32`}
          preserveAspectRatio="none"
          className="tape h-8 w-full"
          aria-hidden="true"
        >
          <rect className="tape-rest" width={width} height={32} />
          <rect className="tape-done" width={done * 10} height={32} />
          {Array.from({ length: Math.max(0, wanted - 1) }, (_, index) => (
            <line
              key={index}
              x1={(index + 1) * 10}
              x2={(index + 1) * 10}
              y1={32}
              y2={tickTop(index + 1)}
              vectorEffect="non-scaling-stroke"
              className="tape-tick"
            />
          ))}
        </svg>
      </div>
    </div>
  );
}

const tickTop = (place: number): number => (place % 10 === 0 ? 14 : place % 5 === 0 ? 18 : 24);
