import { vi } from 'vitest';

/** An upload under way, as a test sees it: it says when how much has gone, and when the answer comes. */
export interface UploadSeen {
  readonly fileName: string;
  progress(loaded: number, total: number): void;
  finish(): Promise<void>;
  breakOff(): void;
}

/** XMLHttpRequest in place of the browser's: jsdom's would go to the network. */
export function fakeUploads(answer: (request: Request) => Promise<Response>): UploadSeen[] {
  const seen: UploadSeen[] = [];
  class FakeXhr {
    upload: {
      onprogress: ((event: { lengthComputable: boolean; loaded: number; total: number }) => void) | null;
    } = { onprogress: null };
    onload: (() => void) | null = null;
    onerror: (() => void) | null = null;
    status = 0;
    responseText = '';
    private address = '';

    open(_method: string, address: string) {
      this.address = address;
    }

    send(form: FormData) {
      const file = form.get('file') as File;
      seen.push({
        fileName: file.name,
        progress: (loaded, total) => this.upload.onprogress?.({ lengthComputable: true, loaded, total }),
        breakOff: () => this.onerror?.(),
        finish: async () => {
          const response = await answer(asRequest(this.address, file));
          this.status = response.status;
          this.responseText = await response.text();
          this.onload?.();
        },
      });
    }
  }
  vi.stubGlobal('XMLHttpRequest', FakeXhr);
  return seen;
}

/** jsdom's File is not the platform's, so the form is made anew of the platform's own parts. */
function asRequest(address: string, file: File): Request {
  const boundary = 'thread';
  const body = `--${boundary}\r\nContent-Disposition: form-data; name="file"; filename="${file.name}"\r\nContent-Type: ${file.type}\r\n\r\ncloth\r\n--${boundary}--\r\n`;
  return new Request(new URL(address, 'http://127.0.0.1:4310'), {
    method: 'POST',
    headers: { 'Content-Type': `multipart/form-data; boundary=${boundary}` },
    body,
  });
}
