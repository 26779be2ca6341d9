import { createReadStream } from 'node:fs';
import { pipeline } from 'node:stream/promises';
import type { Request, Response } from 'express';
import type { StoredForm } from './images.service';
import { formMediaTypes } from './store/picture-keys';

/** Streams a form with its length and type; a client that has it already gets 304. */
export async function sendForm(
  request: Request,
  response: Response,
  form: StoredForm,
  cacheControl: string,
): Promise<void> {
  response.set({
    ETag: `"${form.file.sha256.slice(0, 32)}"`,
    'Cache-Control': cacheControl,
    'Content-Type': formMediaTypes[form.format],
    'X-Content-Type-Options': 'nosniff',
  });
  if (request.fresh) {
    response.status(304).end();
    return;
  }
  response.set('Content-Length', String(form.file.bytes));
  if (request.method === 'HEAD') {
    response.end();
    return;
  }
  try {
    await pipeline(createReadStream(form.file.path), response);
  } catch (fault) {
    // A visitor who leaves in the middle of a picture is no fault of ours.
    if (!request.destroyed && !response.writableEnded) throw fault;
  }
}
