import { rm } from 'node:fs/promises';
import { basename, dirname } from 'node:path';
import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Request, Response } from 'express';
import multer, { diskStorage, MulterError } from 'multer';
import { finalize, type Observable } from 'rxjs';
import { v7 as uuidv7 } from 'uuid';
import { Refusal } from '../../common/refusal';
import { PictureStore } from '../store/picture-store';

const mostBytes = 60 * 1024 * 1024;
/** Beside the file: boundaries and a handful of texts. */
const besideBytes = 64 * 1024;
const limits = {
  fileSize: mostBytes,
  files: 1,
  fields: 10,
  fieldNameSize: 40,
  fieldSize: 8 * 1024,
  parts: 12,
};

const tooLarge = () => new Refusal(413, 'image.too-large', 'A picture may have at most 60 MB.');

/**
 * Receives one picture in the multipart field `file`, streamed to the incoming area under a name made here.
 * Whatever becomes of the request, the received file is gone at its end unless the store has taken it.
 */
@Injectable()
export class UploadInterceptor implements NestInterceptor {
  constructor(private readonly store: PictureStore) {}

  async intercept(context: ExecutionContext, next: CallHandler): Promise<Observable<unknown>> {
    const request = context.switchToHttp().getRequest<Request>();
    if (Number(request.header('content-length') ?? 0) > mostBytes + besideBytes) throw tooLarge();
    await this.receive(request, context.switchToHttp().getResponse<Response>());
    const path = request.file?.path;
    return next.handle().pipe(finalize(() => void (path && rm(path, { force: true }))));
  }

  private async receive(request: Request, response: Response): Promise<void> {
    const target = await this.store.incoming(`${uuidv7()}.part`);
    const storage = diskStorage({
      destination: dirname(target),
      filename: (_request, _file, done) => done(null, basename(target)),
    });
    const receive = multer({ storage, limits, defParamCharset: 'utf8' }).single('file');
    try {
      await new Promise<void>((resolve, reject) => {
        receive(request, response, (fault: unknown) => (fault ? reject(asError(fault)) : resolve()));
      });
    } catch (fault) {
      await rm(target, { force: true });
      throw fault;
    }
  }
}

function asError(fault: unknown): Error {
  if (fault instanceof MulterError) {
    if (fault.code === 'LIMIT_FILE_SIZE') return tooLarge();
    return new Refusal(400, 'image.upload', `The upload could not be read: ${fault.message.toLowerCase()}.`);
  }
  // Busboy's own words for a body that is cut short or has no boundary.
  if (fault instanceof Error && /multipart|boundary|unexpected end|malformed|aborted/i.test(fault.message)) {
    return new Refusal(400, 'image.upload', 'The upload broke off or could not be read. Send it again.');
  }
  return fault instanceof Error ? fault : new Error(String(fault));
}
