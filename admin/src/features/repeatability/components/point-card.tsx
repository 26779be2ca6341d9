import type { RepeatabilityPoint } from '@ellwand/shared/records/repeatability';
import { figure, NOT_YET, reliabilityText, signed } from '../model/figures.js';
import { DifferencePlot } from './difference-plot.js';

/** One measuring point: its figures, how far to trust them, its plot, and the pairs in figures. */
export function PointCard({ point }: { readonly point: RepeatabilityPoint }) {
  const { pointId, label, n, says } = point;
  return (
    <article
      aria-labelledby={`point-${pointId}`}
      className="grid gap-x-8 gap-y-4 border border-hair bg-sheet p-4 sm:p-6 md:grid-cols-2"
    >
      <div>
        <h2 id={`point-${pointId}`} className="title text-title-25">
          {label}
        </h2>
        <p className={`mt-1 text-table ${n < 10 ? 'font-medium text-ink' : 'text-ink-2'}`}>{says}</p>
        <Figures point={point} />
      </div>
      <div className="min-w-0">
        <DifferencePlot point={point} />
        <Pairs point={point} />
      </div>
    </article>
  );
}

function Figures({ point }: { readonly point: RepeatabilityPoint }) {
  const { temMm, percentTem, r, meanDifferenceMm, limitsMm, n, k } = point;
  const rows: readonly (readonly [term: string, value: string | null])[] = [
    ['Technical error', temMm === null ? null : errorText(temMm, percentTem)],
    ['Reliability, R', r === null ? null : reliabilityText(r)],
    ['Mean difference', meanDifferenceMm === null ? null : `${signed(meanDifferenceMm, 1)} mm`],
    ['Limits of agreement', limitsMm && `${signed(limitsMm.lower, 1)} to ${signed(limitsMm.upper, 1)} mm`],
    ['Read twice or more', String(n)],
    ['Readings of each', k > 2 ? `2 to ${k}` : '2'],
  ];
  return (
    <dl className="mt-3 divide-y divide-hair border-y border-hair text-table">
      {rows.map(([term, value]) => (
        <div key={term} className="flex flex-wrap justify-between gap-x-4 py-2">
          <dt className="text-ink-2">{term}</dt>
          <dd className={value === null ? 'text-ink-3' : 'figures font-medium'}>{value ?? NOT_YET}</dd>
        </div>
      ))}
    </dl>
  );
}

function errorText(temMm: number, percentTem: number | null): string {
  const share = percentTem === null ? '' : `, ${figure(percentTem, 2)} % of the mean`;
  return `${figure(temMm, 1)} mm${share}`;
}

function Pairs({ point: { label, pairs } }: { readonly point: RepeatabilityPoint }) {
  const head = 'px-3 py-2 text-right font-medium first:pl-0';
  return (
    <details className="mt-2">
      <summary className="inline-flex min-h-11 cursor-pointer items-center text-table text-indigo underline underline-offset-4">
        The {pairs.length === 1 ? 'pair' : `${pairs.length} pairs`} as a table
      </summary>
      <table className="mt-1 text-table">
        <caption className="sr-only">Pairs of readings of {label.toLowerCase()}, in millimetres</caption>
        <thead className="border-b border-ink text-label text-ink-2">
          <tr>
            <th scope="col" className={head}>
              Mean, mm
            </th>
            <th scope="col" className={head}>
              Later less first, mm
            </th>
          </tr>
        </thead>
        <tbody className="figures">
          {pairs.map(({ meanMm, differenceMm }, index) => (
            <tr key={index} className="border-b border-hair">
              <td className="py-1.5 pr-3 text-right">{figure(meanMm, 1)}</td>
              <td className="px-3 py-1.5 text-right">{signed(differenceMm, 1)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
