import { Image } from '@ellwand/shared/records/image';
import type { z } from 'zod';
import { NoAnswer, parseJson, problemOf } from '../../../lib/problem-error.js';
import { refreshSession, waitForSignIn } from '../../../lib/session-gate.js';

export type UploadedImage = z.infer<typeof Image>;

export interface ImageUpload {
  readonly garmentId: string;
  readonly file: File;
  readonly view: string;
  readonly credit: string;
}

interface Answer {
  readonly status: number;
  readonly text: string;
}

/** One picture per request. XMLHttpRequest, for `fetch` cannot say how much of a body has gone. */
function send(upload: ImageUpload, onFraction: (sent: number) => void): Promise<Answer> {
  const form = new FormData();
  form.set('view', upload.view);
  form.set('alt', '');
  form.set('caption', '');
  form.set('credit', upload.credit);
  form.set('file', upload.file);
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', `/api/v1/workroom/garments/${upload.garmentId}/images`);
    request.upload.onprogress = ({ lengthComputable, loaded, total }) => {
      if (lengthComputable && total > 0) onFraction(loaded / total);
    };
    request.onload = () => resolve({ status: request.status, text: request.responseText });
    request.onerror = () => reject(new NoAnswer('the upload broke off'));
    request.send(form);
  });
}

/** Sends a picture, telling the sent fraction (0 to 1). A refusal becomes a ProblemError with its sentence. */
export async function uploadImage(
  upload: ImageUpload,
  onFraction: (sent: number) => void,
): Promise<UploadedImage> {
  const sentAt = Date.now();
  let answer = await send(upload, onFraction);
  if (answer.status === 401) {
    if (!(await refreshSession(sentAt))) await waitForSignIn();
    answer = await send(upload, onFraction);
  }
  if (answer.status < 200 || answer.status > 299) throw problemOf(answer.status, answer.text);
  const parsed = Image.safeParse(parseJson(answer.text));
  if (!parsed.success) throw new NoAnswer(parsed.error.message);
  return parsed.data;
}
