import { Link } from 'react-router-dom';
import { PageTitle } from '../../../components/ui/page.js';
import { paths, staffPicture } from '../../../config/paths.js';
import { HandsBar } from './hands-bar.js';
import { sheetUnits, type SheetDesk } from '../model/use-sheet-desk.js';

/** What lies on the table, who reads, in which unit, and where the readings are. */
export function SheetHeader({ desk }: { readonly desk: SheetDesk }) {
  const { garment, garmentId } = desk.sheet;
  const number = `${garment.ownNumber}${garment.partSuffix}`;
  return (
    <header className="flex flex-wrap items-center gap-x-5 gap-y-2 border-b border-hair bg-sheet px-4 py-2">
      {garment.firstImageId && (
        <img
          src={staffPicture(garment.firstImageId, 320)}
          alt=""
          className="h-14 w-11 rounded-sm bg-well object-cover object-top max-sm:hidden"
        />
      )}
      <div className="min-w-0 max-w-xl">
        <div className="flex items-baseline gap-3">
          <PageTitle title={`${garment.partName}, ${number}`} className="text-title-25! leading-7!">
            {garment.partName}
          </PageTitle>
          <Link
            to={paths.garment(garmentId)}
            className="figures inline-flex min-h-8 items-center text-table text-indigo underline underline-offset-2"
          >
            {number}
            <span className="sr-only">, back to the garment</span>
          </Link>
        </div>
        <p className="truncate text-table text-ink-2">
          {[garment.title, garment.date, garment.maker].filter(Boolean).join(', ')}
        </p>
        <HandsBar desk={desk} />
      </div>
      <div className="ml-auto flex flex-wrap items-center gap-3">
        {!desk.locked && <UnitChoice desk={desk} />}
        <SendStatus desk={desk} />
      </div>
    </header>
  );
}

function UnitChoice({ desk }: { readonly desk: SheetDesk }) {
  return (
    <div role="group" aria-label="Unit of new readings" className="flex">
      {sheetUnits.map((unit) => (
        <button
          key={unit}
          type="button"
          aria-pressed={desk.unit === unit}
          onClick={() => desk.setUnit(unit)}
          className="-ml-px min-h-11 min-w-11 border border-rule bg-sheet px-3 text-table first:ml-0 first:rounded-l-sm last:rounded-r-sm aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper"
        >
          {unit}
        </button>
      ))}
    </div>
  );
}

function SendStatus({ desk }: { readonly desk: SheetDesk }) {
  const decide = desk.status.includes('decision');
  const sent = desk.status.startsWith('All');
  const look = decide
    ? 'bg-madder-tint text-madder'
    : sent
      ? 'bg-verdigris-tint text-verdigris'
      : 'bg-weld-tint text-weld-text';
  return (
    <p
      role="status"
      className={`figures rounded-sm text-table font-medium ${desk.status ? `px-3 py-2 ${look}` : ''}`}
    >
      {desk.view.entries.length + desk.view.notes.length + desk.view.pictures.length > 0 ? (
        <Link to={paths.tray()} className="underline underline-offset-4">
          {desk.status || 'Kept on this tablet'}
        </Link>
      ) : (
        desk.status
      )}
    </p>
  );
}
