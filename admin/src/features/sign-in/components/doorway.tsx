import type { ReactNode } from 'react';
import { PageTitle } from '../../../components/ui/page.js';

/** The page before the door: one narrow form, and a tape along its edge so that it is plain where one stands. */
export function Doorway({
  title,
  lead,
  children,
}: {
  readonly title: string;
  readonly lead?: ReactNode;
  readonly children: ReactNode;
}) {
  return (
    <main className="grid min-h-dvh md:grid-cols-[minmax(0,1fr)_minmax(0,34rem)]">
      <div className="hidden items-center justify-center border-r border-hair bg-well p-12 md:flex">
        <p className="title-large max-w-md text-title-52">
          The garment is on the table. Measure it once, and well.
        </p>
      </div>
      <div className="flex flex-col justify-center bg-sheet px-5 py-10 sm:px-12">
        <div className="mx-auto w-full max-w-sm">
          <p className="mb-8 text-label font-semibold tracking-wide text-ink-3">Ellwand Workroom</p>
          <PageTitle title={title} />
          {lead && <div className="mt-2 text-table text-ink-2">{lead}</div>}
          <div className="mt-6">{children}</div>
        </div>
      </div>
    </main>
  );
}
