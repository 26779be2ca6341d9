import type { Garment } from '@ellwand/shared/records/garment';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Button, ButtonLink } from '../../components/ui/button.js';
import { Page } from '../../components/ui/page.js';
import { StageMark } from '../../components/ui/stage-mark.js';
import { Failed, Refused, Waiting } from '../../components/ui/states.js';
import { paths } from '../../config/paths.js';
import { momentText } from '../../lib/moments.js';
import { isProblem } from '../../lib/problem-error.js';
import { PicturesPanel } from '../../features/media/components/pictures-panel.js';
import { useMay } from '../../lib/session.js';
import { garmentQuery } from '../../features/garments/api/garment.js';
import { reviseGarment, submitGarment } from '../../features/garments/api/moves.js';
import { lockedWhy } from '../../features/garments/locked-why.js';
import { NotReady } from '../../features/garments/components/not-ready.js';
import { PartsPanel } from '../../features/garments/components/parts-panel.js';
import { RecordEditor } from '../../features/garments/components/record-editor.js';
import { RecordShown } from '../../features/garments/components/record-shown.js';

export function GarmentPage() {
  const { garmentId = '' } = useParams();
  const garment = useQuery(garmentQuery(garmentId));
  if (garment.isPending) {
    return (
      <Page title="Garment">
        <Waiting label="Fetching the garment" />
      </Page>
    );
  }
  if (garment.isError) {
    return (
      <Page
        title={
          isProblem(garment.error) && garment.error.status === 404 ? 'There is no such garment' : 'Garment'
        }
      >
        <Failed error={garment.error} onRetry={() => void garment.refetch()} />
      </Page>
    );
  }
  return <GarmentDesk key={garment.data.id} garment={garment.data} />;
}

function GarmentDesk({ garment }: { readonly garment: Garment }) {
  const mayWrite = useMay('garment:write');
  const locked = lockedWhy(garment, mayWrite);
  return (
    <Page
      title={garment.record.title}
      lead={
        <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
          <span className="figures">{garment.record.ownNumber}</span>
          <StageMark stage={garment.stage} isPublic={garment.isPublic} />
          {garment.publicNumber && garment.publishedVersion !== null && (
            <span>
              public number <span className="figures">{garment.publicNumber}</span>, version{' '}
              {garment.publishedVersion}
            </span>
          )}
        </span>
      }
      aside={<Moves garment={garment} />}
    >
      {garment.returned && garment.stage === 'draft' && (
        <p className="mb-6 rounded-sm border border-logwood bg-logwood-tint p-4 text-table">
          <span className="font-medium text-logwood">
            Returned by {garment.returned.by}, {momentText(garment.returned.at)}:{' '}
          </span>
          {garment.returned.reason}
        </p>
      )}
      <div className="grid gap-10 lg:grid-cols-[minmax(0,1fr)_22rem] lg:items-start">
        <div className="space-y-8 lg:order-last">
          <PartsPanel garment={garment} locked={locked !== null} />
          <PicturesPanel garmentId={garment.id} />
        </div>
        <section id="record" aria-labelledby="record-title">
          <h2 id="record-title" className="title mb-2 text-title-28">
            Record
          </h2>
          {locked ? (
            <>
              <p className="mb-4 rounded-sm bg-well p-4 text-table">{locked}</p>
              <RecordShown record={garment.record} />
            </>
          ) : (
            <RecordEditor garment={garment} />
          )}
        </section>
      </div>
    </Page>
  );
}

/** The record's next step, for whoever may take it. */
function Moves({ garment }: { readonly garment: Garment }) {
  const queries = useQueryClient();
  const maySubmit = useMay('record:submit');
  const mayWrite = useMay('garment:write');
  const settle = {
    onSuccess: (next: Garment) => {
      queries.setQueryData(garmentQuery(next.id).queryKey, next);
      void queries.invalidateQueries({ queryKey: ['garments'] });
    },
  };
  const submit = useMutation({ mutationFn: () => submitGarment(garment.id, garment.version), ...settle });
  const revise = useMutation({ mutationFn: () => reviseGarment(garment.id, garment.version), ...settle });
  const refusal = submit.error ?? revise.error;
  return (
    <div className="flex flex-col items-end gap-2">
      <div className="flex flex-wrap gap-2">
        <ButtonLink to={paths.review(garment.id)}>See as the public will</ButtonLink>
        {garment.stage === 'draft' && maySubmit && (
          <Button tone="action" disabled={submit.isPending} onClick={() => submit.mutate()}>
            Send to review
          </Button>
        )}
        {(garment.stage === 'published' || garment.stage === 'withdrawn') && mayWrite && (
          <Button disabled={revise.isPending} onClick={() => revise.mutate()}>
            Make a new draft
          </Button>
        )}
      </div>
      {isProblem(refusal, 'record.not-ready') ? <NotReady problem={refusal} /> : <Refused error={refusal} />}
    </div>
  );
}
