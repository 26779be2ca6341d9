import { type GarmentFound } from '@ellwand/shared/records/site-catalogue';
import { useLoaderData } from 'react-router-dom';
import { NotFoundPage } from '../notices/not-found-page';
import { WithdrawalPage } from '../notices/withdrawal-page';
import { GarmentView } from './garment-view';

/** A garment, the notice that it was withdrawn, or nothing at all. */
export function GarmentPage() {
  const found = useLoaderData<GarmentFound>();
  if (found.found === 'garment') return <GarmentView garment={found.garment} />;
  if (found.found === 'withdrawn') return <WithdrawalPage notice={found.notice} />;
  return <NotFoundPage />;
}
