import { Image } from '@ellwand/shared/records/image';
import { NoAnswer, parseJson, problemOf } from '../lib/problem-error.js';
import { refreshSession, waitForSignIn } from '../lib/session-gate.js';
import type { TablePicture } from './operation.js';
import type { PictureBytes } from './store.js';

function formOf(
  { id, view, pointId, takenOn, fileName }: TablePicture,
  { bytes, type }: PictureBytes,
): FormData {
  const form = new FormData();
  form.set('id', id);
  form.set('view', view);
  form.set('pointId', pointId ?? '');
  form.set('takenOn', takenOn);
  form.set('file', new File([bytes], fileName, { type }));
  return form;
}

async function post(picture: TablePicture, bytes: PictureBytes): Promise<Response> {
  try {
    return await fetch(`/api/v1/workroom/garments/${picture.garmentId}/images`, {
      method: 'POST',
      credentials: 'same-origin',
      body: formOf(picture, bytes),
    });
  } catch (error) {
    throw new NoAnswer(error instanceof Error ? error.message : 'the upload broke off');
  }
}

/** Sends a picture taken at the table. Sent twice, it is kept once: its id was made where it was taken. */
export async function sendPicture(picture: TablePicture, bytes: PictureBytes): Promise<void> {
  const sentAt = Date.now();
  let answer = await post(picture, bytes);
  if (answer.status === 401) {
    if (!(await refreshSession(sentAt))) await waitForSignIn();
    answer = await post(picture, bytes);
  }
  const text = await answer.text();
  if (!answer.ok) throw problemOf(answer.status, text);
  if (!Image.safeParse(parseJson(text)).success) throw new NoAnswer('an answer that is no picture');
}
