import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { useSyncExternalStore } from 'react';
import { useSearchParams } from 'react-router-dom';
import { isUnit } from '../../lib/range-boxes';
import { currentUnit, subscribeToUnit } from './unit-store';

/** The unit shown; on the server and in the first render of the browser, the address's or millimetres. */
export function useUnit(): LengthUnit {
  const [params] = useSearchParams();
  const inAddress = params.get('unit');
  return useSyncExternalStore(subscribeToUnit, currentUnit, () => (isUnit(inAddress) ? inAddress : 'mm'));
}
