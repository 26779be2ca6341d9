import { Image, type ImageChange } from '@ellwand/shared/records/image';
import { api } from '../../../lib/api-client.js';

export const changeImage = (id: string, version: number, body: ImageChange) =>
  api.patch(`/workroom/images/${id}`, Image, { body, version });

export const deleteImage = (id: string, version: number) =>
  api.deleteQuietly(`/workroom/images/${id}`, { version });
