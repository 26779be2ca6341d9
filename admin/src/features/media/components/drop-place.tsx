import { type DragEvent, useRef, useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { acceptedTypes } from '../use-uploads.js';

/** Where pictures are dropped; the button beside it does the same without dragging. */
export function DropPlace({ onFiles }: { readonly onFiles: (files: readonly File[]) => void }) {
  const picker = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    onFiles([...event.dataTransfer.files]);
  };
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={`mt-2 rounded-sm border border-dashed p-4 text-table ${over ? 'border-indigo bg-indigo-tint' : 'border-rule bg-sheet'}`}
    >
      <p className="mb-2 text-ink-2">
        Drop pictures here, several at once. JPEG, PNG, WebP or TIFF, up to 60 MB each.
      </p>
      <input
        ref={picker}
        type="file"
        multiple
        accept={acceptedTypes.join(',')}
        aria-label="Pictures to add"
        tabIndex={-1}
        className="sr-only"
        onChange={(event) => {
          onFiles([...(event.target.files ?? [])]);
          // The same file may be chosen again, after it was mended.
          event.target.value = '';
        }}
      />
      <Button onClick={() => picker.current?.click()}>Choose pictures</Button>
    </div>
  );
}
