import { rmSync } from 'node:fs';
import {
  BadRequestException,
  type CallHandler,
  type ExecutionContext,
  Injectable,
  type NestInterceptor,
  PayloadTooLargeException,
} from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import type { Request } from 'express';
import { finalize, type Observable } from 'rxjs';
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

/** A received file: where it lies, and what its sender called it. */
export interface Upload {
  readonly path: string;
  readonly originalname: string;
}

/**
 * Receives one picture in the multipart field `file`, streamed to the incoming area under a random name.
 * Whatever becomes of the request, the received file is gone at its end unless the store has taken it.
 */
@Injectable()
export class UploadInterceptor implements NestInterceptor {
  private readonly receiver: NestInterceptor;

  constructor(private readonly store: PictureStore) {
    const Receiver = FileInterceptor('file', { dest: store.incomingFolder, limits, defParamCharset: 'utf8' });
    this.receiver = new Receiver();
  }

  async intercept(context: ExecutionContext, next: CallHandler): Promise<Observable<unknown>> {
    const request = context.switchToHttp().getRequest<Request & { readonly file?: Upload }>();
    // Said before the first byte of the picture is read.
    if (Number(request.header('content-length') ?? 0) > mostBytes + besideBytes) throw tooLarge();
    await this.store.incoming('any');
    const answer = await this.receive(context, next);
    const path = request.file?.path;
    return answer.pipe(finalize(() => path && rmSync(path, { force: true })));
  }

  private async receive(context: ExecutionContext, next: CallHandler): Promise<Observable<unknown>> {
    try {
      return await this.receiver.intercept(context, next);
    } catch (fault) {
      if (fault instanceof PayloadTooLargeException) throw tooLarge();
      if (!(fault instanceof BadRequestException)) throw fault;
      throw new Refusal(400, 'image.upload', 'The upload broke off or could not be read. Send it again.');
    }
  }
}

function tooLarge(): Refusal {
  return new Refusal(413, 'image.too-large', 'A picture may have at most 60 MB.');
}
