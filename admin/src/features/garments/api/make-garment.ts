import { Garment, type NewGarment } from '@ellwand/shared/records/garment';
import { api } from '../../../lib/api-client.js';

export const makeGarment = (body: NewGarment) => api.post('/workroom/garments', Garment, { body });
