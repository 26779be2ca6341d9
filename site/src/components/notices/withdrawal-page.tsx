import type { WithdrawalNotice } from '@ellwand/shared/records/published-garment';
import { SiteLink } from '../ui/site-link';
import { paths } from '../../config/paths';
import { museum } from '../../config/museum';
import { dayText } from '../../lib/words';

/** The page that stands where a garment was: its number is never given to another. */
export function WithdrawalPage({ notice }: { readonly notice: WithdrawalNotice }) {
  return (
    <div className="wide notice">
      <p className="notice-kicker">Withdrawal notice</p>
      <h1 className="notice-title">This garment is no longer shown</h1>
      <dl className="facts">
        <div>
          <dt>Number</dt>
          <dd>{notice.number}</dd>
        </div>
        <div>
          <dt>Withdrawn</dt>
          <dd>
            <time dateTime={notice.withdrawnOn}>{dayText(notice.withdrawnOn)}</time>
          </dd>
        </div>
      </dl>
      <p className="notice-words">{notice.notice}</p>
      <p>
        Its versions and pictures are withdrawn with it. The number stays with this garment and is never given
        to another. If you have cited it, write to{' '}
        <a className="link" href={`mailto:${museum.email}`}>
          the museum
        </a>
        .
      </p>
      <p className="notice-actions">
        <SiteLink to={paths.search()} className="button-quiet">
          Search the catalogue
        </SiteLink>
      </p>
    </div>
  );
}
