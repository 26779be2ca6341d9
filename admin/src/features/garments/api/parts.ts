import { Garment, type NewPart } from '@ellwand/shared/records/garment';
import { api } from '../../../lib/api-client.js';

export const addPart = (garmentId: string, version: number, body: NewPart) =>
  api.post(`/workroom/garments/${garmentId}/parts`, Garment, { body, version });

export const removePart = (partId: string, garmentVersion: number) =>
  api.delete(`/workroom/parts/${partId}`, Garment, { version: garmentVersion });

/** Makes what stands for the garment's parts laid together as worn. */
export const layTogether = (garmentId: string, version: number) =>
  api.post(`/workroom/garments/${garmentId}/worn-together`, Garment, { version, body: {} });
