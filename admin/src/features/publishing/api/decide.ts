import { Garment } from '@ellwand/shared/records/garment';
import type { ReturnReason, Withdrawal } from '@ellwand/shared/records/publishing';
import type { z } from 'zod';
import { api } from '../../../lib/api-client.js';

const move =
  (verb: string) =>
  (garmentId: string, version: number, body: unknown = {}) =>
    api.post(`/workroom/garments/${garmentId}/${verb}`, Garment, { version, body });

export const approveGarment = move('approve');
export const publishGarment = move('publish');
export const returnGarment: (
  id: string,
  version: number,
  body: z.infer<typeof ReturnReason>,
) => Promise<Garment> = move('return');
export const withdrawGarment: (id: string, version: number, body: Withdrawal) => Promise<Garment> =
  move('withdraw');
