import { Garment, type NewPart } from '@ellwand/shared/records/garment';
import { api } from '../../../lib/api-client.js';

export const addPart = (garmentId: string, version: number, body: NewPart) =>
  api.post(`/workroom/garments/${garmentId}/parts`, Garment, { body, version });

export const removePart = (partId: string, garmentVersion: number) =>
  api.delete(`/workroom/parts/${partId}`, Garment, { version: garmentVersion });
