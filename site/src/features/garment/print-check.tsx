/** On paper only: whoever measures this line knows whether the printer kept the scale. */
export function PrintCheck() {
  return (
    <p className="print-check">
      <svg width="10cm" height="5mm" viewBox="0 0 100 5" aria-hidden="true">
        <path
          d="M0.15 0v5M99.85 0v5M0 2.5h100M10 1.5v2M20 1.5v2M30 1.5v2M40 1.5v2M50 1v3M60 1.5v2M70 1.5v2M80 1.5v2M90 1.5v2"
          fill="none"
          stroke="#17212B"
          strokeWidth="0.3"
        />
      </svg>
      <span>check: this line is 10 cm</span>
    </p>
  );
}
