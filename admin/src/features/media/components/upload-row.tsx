import { Button } from '../../../components/ui/button.js';
import { FieldError } from '../../../components/ui/field.js';
import type { Upload } from '../use-uploads.js';

/** One picture on its way, with a true fraction, or the sentence with which it was refused. */
export function UploadRow({
  upload,
  onAgain,
  onDismiss,
}: {
  readonly upload: Upload;
  readonly onAgain: () => void;
  readonly onDismiss: () => void;
}) {
  const { fileName, sent, refusal } = upload;
  const percent = Math.round(sent * 100);
  return (
    <li className="rounded-sm border border-hair bg-sheet p-3">
      <p className="truncate text-table font-medium">{fileName}</p>
      {refusal === null ? (
        <>
          <progress
            aria-label={`Sending ${fileName}`}
            value={percent}
            max={100}
            className="progress mt-2 w-full"
          />
          <p className="figures text-label text-ink-2">
            {percent < 100 ? `Sending, ${percent} %` : 'Sent; the museum’s server is looking at it'}
          </p>
        </>
      ) : (
        <div role="alert">
          <FieldError id={`refused-${upload.id}`}>{refusal}</FieldError>
          <div className="mt-2 flex gap-2">
            <Button height="dense" onClick={onAgain}>
              Send again<span className="sr-only">: {fileName}</span>
            </Button>
            <Button height="dense" tone="quiet" onClick={onDismiss}>
              Leave it out<span className="sr-only">: {fileName}</span>
            </Button>
          </div>
        </div>
      )}
    </li>
  );
}
