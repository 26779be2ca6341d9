import { useQuery } from '@tanstack/react-query';
import { NavLink } from 'react-router-dom';
import { StageMark } from '../../../components/ui/stage-mark.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { garmentListQuery } from '../../garments/api/garment-list.js';

const SIZE = 100;
/** Others send records while a curator looks at one: the queue asks again by itself. */
const ASK_AGAIN_MS = 10_000;

/** What waits for a curator: records in review, then those approved and not yet published. */
export function ReviewQueue() {
  const inReview = useQuery({
    ...garmentListQuery({ stage: 'in-review', size: SIZE }),
    refetchInterval: ASK_AGAIN_MS,
  });
  const approved = useQuery({
    ...garmentListQuery({ stage: 'approved', size: SIZE }),
    refetchInterval: ASK_AGAIN_MS,
  });
  const failed = [inReview, approved].find(({ isError }) => isError);
  if (failed) return <Failed error={failed.error} onRetry={() => void failed.refetch()} />;
  if (inReview.isPending || approved.isPending) return <Waiting label="Fetching the queue" rows={3} />;
  const waiting = [...(inReview.data?.items ?? []), ...(approved.data?.items ?? [])];
  if (waiting.length === 0) return <p className="text-table text-ink-2">Nothing waits for review.</p>;
  return (
    <ul className="divide-y divide-hair border-y border-hair">
      {waiting.map(({ id, title, ownNumber, stage }) => (
        <li key={id}>
          <NavLink
            to={paths.review(id)}
            className={({ isActive }) =>
              `block border-l-4 px-3 py-2 text-table hover:bg-well ${isActive ? 'border-indigo bg-sheet font-medium' : 'border-transparent'}`
            }
          >
            <span className="figures block text-label text-ink-2">{ownNumber}</span>
            <span className="block">{title}</span>
            <StageMark stage={stage} />
          </NavLink>
        </li>
      ))}
    </ul>
  );
}
