import type { Garment } from '@ellwand/shared/records/garment';
import type { Review } from '@ellwand/shared/records/publishing';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { StageMark } from '../../../components/ui/stage-mark.js';
import { Refused } from '../../../components/ui/states.js';
import { isProblem } from '../../../lib/problem-error.js';
import { useMay } from '../../../lib/session.js';
import { garmentQuery } from '../../garments/api/garment.js';
import { submitGarment } from '../../garments/api/moves.js';
import { approveGarment, publishGarment, returnGarment, withdrawGarment } from '../api/decide.js';
import { PublishQuestion } from './publish-question.js';
import { ReturnQuestion } from './return-question.js';
import { WithdrawQuestion } from './withdraw-question.js';

type Asking = 'return' | 'publish' | 'withdraw' | null;

/** What may be decided now, by whoever looks; and where they may not, the sentence why. */
export function Decisions({ garment, review }: { readonly garment: Garment; readonly review: Review }) {
  const [asking, setAsking] = useState<Asking>(null);
  const close = () => setAsking(null);
  const { decide, error, isPending } = useDecision(garment, close);
  const mayReview = useMay('record:review');
  const mayPublish = useMay('record:publish');
  const mayWithdraw = useMay('record:withdraw');
  const maySubmit = useMay('record:submit');
  const { stage, id, version } = garment;
  const stopsApproval = review.readiness.some(({ blocks }) => blocks === 'approve');
  return (
    <section aria-label="Decision" className="space-y-3 border border-hair bg-sheet p-4">
      <StageMark stage={stage} isPublic={garment.isPublic} />
      {stage === 'in-review' && mayReview && review.mayNotApprove !== null && (
        <p id="may-not-approve" className="border-l-4 border-logwood pl-3 text-table">
          <span className="font-medium">You cannot approve this. </span>
          {review.mayNotApprove}
        </p>
      )}
      <div className="flex flex-wrap gap-2">
        {stage === 'draft' && maySubmit && (
          <Button tone="action" disabled={isPending} onClick={() => decide(() => submitGarment(id, version))}>
            Send to review
          </Button>
        )}
        {stage === 'in-review' && mayReview && review.mayNotApprove === null && (
          <Button
            tone="action"
            disabled={isPending || stopsApproval}
            onClick={() => decide(() => approveGarment(id, version))}
          >
            Approve
          </Button>
        )}
        {stage === 'approved' && mayPublish && (
          <Button tone="action" disabled={isPending} onClick={() => setAsking('publish')}>
            Publish version {review.nextVersion}
          </Button>
        )}
        {(stage === 'in-review' || stage === 'approved') && mayReview && (
          <Button onClick={() => setAsking('return')}>Return with a reason</Button>
        )}
        {garment.isPublic && mayWithdraw && (
          <Button tone="danger" onClick={() => setAsking('withdraw')}>
            Withdraw
          </Button>
        )}
      </div>
      {stopsApproval && stage === 'in-review' && (
        <p className="text-label text-ink-3">
          It can be approved when what keeps it is answered; see “Still open”.
        </p>
      )}
      {asking === null && <Refused error={error} />}
      <ReturnQuestion
        open={asking === 'return'}
        onClose={close}
        error={error}
        onSay={(body) => decide(() => returnGarment(id, version, body))}
      />
      <PublishQuestion
        open={asking === 'publish'}
        onClose={close}
        review={review}
        error={error}
        pending={isPending}
        onPublish={() => decide(() => publishGarment(id, version))}
      />
      <WithdrawQuestion
        open={asking === 'withdraw'}
        onClose={close}
        error={error}
        onWithdraw={(body) => decide(() => withdrawGarment(id, version, body))}
      />
    </section>
  );
}

/** One decision at a time; afterwards everything that was shown of the garment is asked for again. */
function useDecision(garment: Garment, onDone: () => void) {
  const queries = useQueryClient();
  const askAgain = () =>
    Promise.all(
      ['garment', 'review', 'preview', 'revisions', 'garments'].map((key) =>
        queries.invalidateQueries({ queryKey: [key] }),
      ),
    );
  const decision = useMutation({
    mutationFn: (act: () => Promise<Garment>) => act(),
    onSuccess: async (next) => {
      queries.setQueryData(garmentQuery(garment.id).queryKey, next);
      onDone();
      await askAgain();
    },
    onError: (error) => {
      if (isProblem(error)) void askAgain();
    },
  });
  return {
    decide: (act: () => Promise<Garment>) => decision.mutate(act),
    error: decision.error,
    isPending: decision.isPending,
  };
}
