import { figureText, formatLength, type LengthUnit, lengthUnits } from '@ellwand/shared/units/format-length';
import { deservedDenominator } from '@ellwand/shared/units/fractions';
import { fromMmString, isMmString, type Length as ExactLength } from '@ellwand/shared/units/length';

interface LengthProps {
  /** Decimal millimetres, as the API writes lengths. */
  readonly mm: string;
  /** Inches are shown no finer than the standard uncertainty deserves; eighths where it is not known. */
  readonly uncertaintyMm?: string | undefined;
  /** Without the unit, where a heading names it. */
  readonly bare?: boolean;
}

/** A length in all three units; the attribute on <html> shows one of them. */
export function Length({ mm, uncertaintyMm, bare = false }: LengthProps) {
  if (!isMmString(mm)) return <>{mm}</>;
  const length = fromMmString(mm);
  const denominator = uncertaintyMm === undefined ? 8 : deservedDenominator(Number(uncertaintyMm), 8);
  const write = bare ? figureText : formatLength;
  return (
    <InEachUnit write={(unit) => write(length, unit, { denominator, places: placesOf(length, unit) })} />
  );
}

/** Whole millimetres as people read them; a converted record keeps its one decimal. */
function placesOf(length: ExactLength, unit: LengthUnit): number {
  if (unit === 'cm') return 1;
  return length % 10_000 === 0 ? 0 : 1;
}

/** A standard uncertainty: one more place than the length it belongs to, sixteenths in inches. */
export function Uncertainty({ mm }: { readonly mm: string }) {
  if (!isMmString(mm)) return <>{mm}</>;
  const length = fromMmString(mm);
  return (
    <InEachUnit
      write={(unit) => {
        if (unit !== 'in') return figureText(length, unit, { places: unit === 'cm' ? 2 : 1 });
        const sixteenths = figureText(length, 'in', { denominator: 16 });
        return sixteenths === '0' ? '1/16' : sixteenths;
      }}
    />
  );
}

/** How far apart readings lay: in inches by sixteenths, since eighths would call 1 mm nothing. */
export function Spread({ mm }: { readonly mm: string }) {
  if (!isMmString(mm)) return <>{mm}</>;
  const length = fromMmString(mm);
  return (
    <InEachUnit
      write={(unit) => {
        const text = formatLength(length, unit, { denominator: 16, places: placesOf(length, unit) });
        return text === '0 in' && length !== 0 ? 'under 1/16 in' : text;
      }}
    />
  );
}

/** The name of the unit shown, for headings: "mm". */
export function UnitName() {
  return <InEachUnit write={(unit) => unit} />;
}

interface InEachUnitProps {
  readonly write: (unit: LengthUnit) => string;
  /** Longer words may break; a figure never parts from its unit. */
  readonly wraps?: boolean;
}

export function InEachUnit({ write, wraps = false }: InEachUnitProps) {
  return lengthUnits.map((unit) => (
    <span key={unit} data-unit={unit} className={wraps ? undefined : 'figure'}>
      {write(unit)}
    </span>
  ));
}
