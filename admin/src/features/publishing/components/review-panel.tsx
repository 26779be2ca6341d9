import type { Garment } from '@ellwand/shared/records/garment';
import type { Change, Review } from '@ellwand/shared/records/publishing';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { Failed } from '../../../components/ui/states.js';
import { withinWorkroom } from '../../../config/paths.js';
import { momentText } from '../../../lib/moments.js';
import { revisionsQuery } from '../api/revisions.js';
import { Decisions } from './decisions.js';

/** What a curator weighs: who did what, what is still open, what changes for the public; then the decision. */
export function ReviewPanel({ garment, review }: { readonly garment: Garment; readonly review: Review }) {
  return (
    <div className="space-y-6">
      <Decisions garment={garment} review={review} />
      <section>
        <h2 className="text-body font-semibold">Still open</h2>
        {review.readiness.length === 0 ? (
          <p className="text-table text-ink-2">Nothing is open.</p>
        ) : (
          <ul className="mt-1 space-y-2">
            {review.readiness.map(({ sentence, href, blocks }) => (
              <li key={sentence} className="border-l-4 border-madder bg-sheet px-3 py-2 text-table">
                <p>{sentence}</p>
                <p className="text-label text-ink-3">
                  Keeps it from being{' '}
                  {blocks === 'submit' ? 'sent to review' : blocks === 'approve' ? 'approved' : 'published'}.{' '}
                  {href && (
                    <Link to={withinWorkroom(href)} className="text-indigo underline">
                      Mend it<span className="sr-only">: {sentence}</span>
                    </Link>
                  )}
                </p>
              </li>
            ))}
          </ul>
        )}
      </section>
      <section>
        <h2 className="text-body font-semibold">
          {review.nextVersion === 1 ? 'New to the public' : `What version ${review.nextVersion} changes`}
        </h2>
        {review.changes.length === 0 && (
          <p className="text-table text-ink-2">Nothing differs from the public version.</p>
        )}
        <ul className="mt-1 divide-y divide-hair">
          {review.changes.map((change) => (
            <ChangeRow key={`${change.area} ${change.label}`} change={change} />
          ))}
        </ul>
      </section>
      <section>
        <h2 className="text-body font-semibold">Who did what</h2>
        <ul className="mt-1 text-table">
          {review.people.map(({ name, did }) => (
            <li key={`${name} ${did}`}>
              {name}: <span className="text-ink-2">{did}</span>
            </li>
          ))}
        </ul>
      </section>
      <History garmentId={garment.id} />
    </div>
  );
}

const changeWords = { added: 'Added', removed: 'Removed', changed: 'Changed' } as const;
const changeLooks = {
  added: 'bg-verdigris-tint text-verdigris',
  removed: 'bg-madder-tint text-madder',
  changed: 'bg-indigo-tint text-indigo',
} as const;

function ChangeRow({ change }: { readonly change: Change }) {
  const { kind, label, before, after } = change;
  return (
    <li className="py-2 text-table">
      <p>
        <span className={`mr-2 rounded-sm px-1.5 py-0.5 text-label font-medium ${changeLooks[kind]}`}>
          {changeWords[kind]}
        </span>
        <span className="font-medium">{label}</span>
      </p>
      {before !== null && (
        <p className="mt-1 break-words text-ink-3">
          <span className="text-label">before: </span>
          <del className="decoration-1">{before}</del>
        </p>
      )}
      {after !== null && (
        <p className="break-words">
          <span className="text-label text-ink-3">now: </span>
          <ins className="no-underline">{after}</ins>
        </p>
      )}
    </li>
  );
}

const outcomes = {
  'in-review': 'in review',
  returned: 'returned',
  approved: 'approved',
  published: 'published',
  'set-aside': 'set aside',
} as const;

function History({ garmentId }: { readonly garmentId: string }) {
  const revisions = useQuery(revisionsQuery(garmentId));
  if (revisions.isError) return <Failed error={revisions.error} onRetry={() => void revisions.refetch()} />;
  if (!revisions.data || revisions.data.length === 0) return null;
  return (
    <section>
      <h2 className="text-body font-semibold">Earlier submissions</h2>
      <ul className="mt-1 divide-y divide-hair text-table">
        {revisions.data.map(
          ({ id, number, outcome, submittedBy, submittedAt, decidedBy, reason, publishedVersion }) => (
            <li key={id} className="py-2">
              <p>
                No. {number}, {outcomes[outcome]}
                {publishedVersion !== null && ` as version ${publishedVersion}`}
              </p>
              <p className="text-label text-ink-3">
                Sent by {submittedBy}, {momentText(submittedAt)}
                {decidedBy && `; decided by ${decidedBy}`}
              </p>
              {reason && <p className="text-ink-2">“{reason}”</p>}
            </li>
          ),
        )}
      </ul>
    </section>
  );
}
