import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef, useState } from 'react';
import { newId } from '../../lib/ids.js';
import { isProblem } from '../../lib/problem-error.js';
import { imagesQuery } from './api/images.js';
import { uploadImage } from './api/upload-image.js';

export interface Upload {
  readonly id: string;
  readonly fileName: string;
  /** The sent fraction, 0 to 1. */
  readonly sent: number;
  /** Why the picture was refused, in a sentence; null while it is on its way. */
  readonly refusal: string | null;
  readonly file: File;
}

/** Types the museum keeps; the API looks into the file itself and has the last word. */
export const acceptedTypes = ['image/jpeg', 'image/png', 'image/webp', 'image/tiff'];
const LARGEST_BYTES = 60 * 1024 * 1024;

/** Why a file need not even be sent; null where it may be. */
export function refusedAtOnce(file: Pick<File, 'type' | 'size' | 'name'>): string | null {
  if (file.type !== '' && !acceptedTypes.includes(file.type)) {
    return 'Not a picture that can be kept. JPEG, PNG, WebP and TIFF can.';
  }
  if (file.size > LARGEST_BYTES) return 'Larger than 60 MB. Save it smaller, up to 100 megapixels.';
  return null;
}

function refusalSentence(error: unknown): string {
  if (isProblem(error) && error.status === 413)
    return 'Larger than 60 MB. Save it smaller, up to 100 megapixels.';
  return error instanceof Error ? error.message : 'Not received.';
}

/** Pictures on their way up, two at a time, each with its own progress and its own refusal. */
export function useUploads(garmentId: string) {
  const queries = useQueryClient();
  const [uploads, setUploads] = useState<readonly Upload[]>([]);
  const lanes = useRef<Promise<void>[]>([Promise.resolve(), Promise.resolve()]);

  const change = useCallback((id: string, next: Partial<Upload>) => {
    setUploads((all) => all.map((one) => (one.id === id ? { ...one, ...next } : one)));
  }, []);
  const dismiss = useCallback((id: string) => setUploads((all) => all.filter((one) => one.id !== id)), []);

  const send = useCallback(
    async ({ id, file }: Upload) => {
      try {
        await uploadImage({ garmentId, file, view: 'front', credit: '' }, (sent) => change(id, { sent }));
        await queries.invalidateQueries({ queryKey: imagesQuery(garmentId).queryKey });
        dismiss(id);
      } catch (error) {
        change(id, { refusal: refusalSentence(error) });
      }
    },
    [garmentId, change, dismiss, queries],
  );

  const add = useCallback(
    (files: readonly File[]) => {
      const fresh = files.map((file) => ({
        id: newId(),
        fileName: file.name,
        sent: 0,
        refusal: refusedAtOnce(file),
        file,
      }));
      setUploads((all) => [...all, ...fresh]);
      fresh
        .filter(({ refusal }) => refusal === null)
        .forEach((upload, index) => {
          const lane = index % lanes.current.length;
          lanes.current[lane] = (lanes.current[lane] ?? Promise.resolve()).then(() => send(upload));
        });
    },
    [send],
  );
  const again = useCallback(
    (upload: Upload) => {
      change(upload.id, { refusal: null, sent: 0 });
      void send(upload);
    },
    [change, send],
  );
  return { uploads, add, again, dismiss };
}
