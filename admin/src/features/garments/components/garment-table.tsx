import type { GarmentSummary } from '@ellwand/shared/records/garment';
import { Link } from 'react-router-dom';
import { StageMark } from '../../../components/ui/stage-mark.js';
import { paths, staffPicture } from '../../../config/paths.js';
import { dayText } from '../../../lib/moments.js';
import { kindWord } from '../../../lib/words/kind-word.js';

export const rowHeights = ['36', '44', '56'] as const;
type RowHeight = (typeof rowHeights)[number];

const heights: Readonly<Record<RowHeight, string>> = { '36': 'h-9', '44': 'h-11', '56': 'h-14' };
const thumbs: Readonly<Record<RowHeight, string>> = { '36': 'h-8 w-6', '44': 'h-10 w-8', '56': 'h-12 w-10' };

/** The list as a table; on a phone the same rows stand as blocks. */
export function GarmentTable({
  garments,
  height,
}: {
  readonly garments: readonly GarmentSummary[];
  readonly height: RowHeight;
}) {
  return (
    <table className="w-full border-collapse bg-sheet text-table max-md:block">
      <caption className="sr-only">Garments, with number, title, date, stage and what is open</caption>
      <thead className="border-b border-ink text-left text-label text-ink-2 max-md:sr-only">
        <tr>
          <th scope="col" className="w-14 px-3 py-2 font-medium">
            <span className="sr-only">Picture</span>
          </th>
          <th scope="col" className="px-3 py-2 font-medium">
            Number
          </th>
          <th scope="col" className="w-full px-3 py-2 font-medium">
            Title
          </th>
          <th scope="col" className="px-3 py-2 font-medium">
            Kind
          </th>
          <th scope="col" className="px-3 py-2 font-medium">
            Date
          </th>
          <th scope="col" className="px-3 py-2 text-right font-medium max-lg:hidden">
            Pictures
          </th>
          <th scope="col" className="px-3 py-2 font-medium">
            Stage
          </th>
          <th scope="col" className="px-3 py-2 font-medium max-lg:hidden">
            Changed
          </th>
        </tr>
      </thead>
      <tbody className="max-md:block">
        {garments.map((garment) => (
          <GarmentRow key={garment.id} garment={garment} height={height} />
        ))}
      </tbody>
    </table>
  );
}

function GarmentRow({ garment, height }: { readonly garment: GarmentSummary; readonly height: RowHeight }) {
  return (
    <tr
      className={`relative border-b border-hair hover:bg-paper max-md:grid max-md:grid-cols-[4.5rem_minmax(0,1fr)] max-md:gap-x-2 max-md:py-2 ${heights[height]} max-md:h-auto`}
    >
      <td className="px-3 max-md:row-span-4 max-md:px-2">
        <Thumbnail garment={garment} className={`${thumbs[height]} max-md:h-20 max-md:w-14`} />
      </td>
      <td className="figures whitespace-nowrap px-3 text-ink-2 max-md:px-2 max-md:text-label">
        {garment.ownNumber}
      </td>
      <th scope="row" className="px-3 text-left font-medium max-md:px-2">
        <Link to={paths.garment(garment.id)} className="hover:underline after:absolute after:inset-0">
          {garment.title}
        </Link>
      </th>
      <td className="whitespace-nowrap px-3 text-ink-2 max-md:hidden">{kindWord(garment.kind)}</td>
      <td className="figures whitespace-nowrap px-3 text-ink-2 max-md:px-2 max-md:text-label">
        {garment.date}
      </td>
      <td className="figures px-3 text-right text-ink-2 max-lg:hidden">{garment.pictures}</td>
      <td className="px-3 max-md:px-2">
        <StageMark stage={garment.stage} isPublic={garment.isPublic} />
        {garment.openSheets > 0 && (
          <span className="ml-2 whitespace-nowrap text-label text-ink-2">
            {openSheets(garment.openSheets)}
          </span>
        )}
      </td>
      <td className="figures whitespace-nowrap px-3 text-ink-3 max-lg:hidden">
        {dayText(garment.updatedAt)}
      </td>
    </tr>
  );
}

const openSheets = (sheets: number) => (sheets === 1 ? '1 sheet open' : `${sheets} sheets open`);

function Thumbnail({ garment, className }: { readonly garment: GarmentSummary; readonly className: string }) {
  if (!garment.firstImageId)
    return <div className={`${className} rounded-sm border border-dashed border-rule`} aria-hidden="true" />;
  // The row's link names the garment; the thumbnail says nothing more.
  return (
    <img
      src={staffPicture(garment.firstImageId, 320)}
      alt=""
      loading="lazy"
      className={`${className} rounded-sm bg-well object-cover object-top`}
    />
  );
}
