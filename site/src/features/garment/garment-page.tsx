import { useLoaderData } from 'react-router-dom';
import { NotFoundPage } from '../../components/notices/not-found-page';
import { WithdrawalPage } from '../../components/notices/withdrawal-page';
import type { GarmentPageData } from './garment-loader';
import { GarmentView } from './garment-view';

/** A garment, the notice that it was withdrawn, or nothing at all. */
export function GarmentPage() {
  const { found, origin } = useLoaderData<GarmentPageData>();
  if (found.found === 'garment') return <GarmentView garment={found.garment} origin={origin} />;
  if (found.found === 'withdrawn') return <WithdrawalPage notice={found.notice} />;
  return <NotFoundPage />;
}
