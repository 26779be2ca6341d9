import type { ReactNode } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { ButtonLink } from '../../components/ui/button.js';
import { Page } from '../../components/ui/page.js';
import { Empty, Failed, Waiting } from '../../components/ui/states.js';
import { paths } from '../../config/paths.js';
import { garmentQuery } from '../../features/garments/api/garment.js';
import { previewQuery } from '../../features/publishing/api/preview.js';
import { reviewQuery } from '../../features/publishing/api/review.js';
import { Preview } from '../../features/publishing/components/preview.js';
import { ReviewPanel } from '../../features/publishing/components/review-panel.js';
import { ReviewQueue } from '../../features/publishing/components/review-queue.js';
import { useMay } from '../../lib/session.js';

/** Queue at the left, the record as the public will see it in the centre, findings and decision at the right. */
export function ReviewPage() {
  const { garmentId } = useParams();
  const reviews = useMay('record:review');
  const queue = reviews && (
    <aside aria-label="Review queue" className="xl:sticky xl:top-4">
      <h2 className="mb-2 text-label font-semibold text-ink-2">Waiting for review</h2>
      <ReviewQueue />
    </aside>
  );
  if (garmentId === undefined) {
    return (
      <Page title="Review">
        <div className="grid gap-8 xl:grid-cols-[15rem_minmax(0,1fr)] xl:items-start">
          {queue}
          <Empty title="Choose a record">
            What you choose is shown as the public would see it, with what it changes.
          </Empty>
        </div>
      </Page>
    );
  }
  return <ReviewOf key={garmentId} garmentId={garmentId} queue={queue} />;
}

function ReviewOf({ garmentId, queue }: { readonly garmentId: string; readonly queue: ReactNode }) {
  const garment = useQuery(garmentQuery(garmentId));
  const review = useQuery(reviewQuery(garmentId));
  const preview = useQuery(previewQuery(garmentId));
  const failed = [garment, review].find(({ isError }) => isError);
  return (
    <Page
      title="Review and publish"
      lead={garment.data && <span className="figures">{garment.data.record.ownNumber}</span>}
      aside={<ButtonLink to={paths.garment(garmentId)}>Open the record</ButtonLink>}
    >
      <div
        className={`grid gap-8 lg:grid-cols-[minmax(0,1fr)_20rem] lg:items-start ${queue ? 'xl:grid-cols-[13rem_minmax(0,1fr)_20rem]' : ''}`}
      >
        {queue && <div className="max-xl:order-last lg:max-xl:col-span-2">{queue}</div>}
        <div className="min-w-0">
          {preview.isPending && <Waiting label="Drawing up the public page" rows={10} />}
          {preview.isError && <Failed error={preview.error} onRetry={() => void preview.refetch()} />}
          {preview.data && <Preview garment={preview.data} />}
        </div>
        <div className="max-lg:order-first">
          {failed && <Failed error={failed.error} onRetry={() => void failed.refetch()} />}
          {!failed && (garment.isPending || review.isPending) && <Waiting label="Gathering what changed" />}
          {garment.data && review.data && <ReviewPanel garment={garment.data} review={review.data} />}
        </div>
      </div>
    </Page>
  );
}
