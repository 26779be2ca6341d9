import { useRef, useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { offerFile } from '../../../lib/offer-file.js';
import { useOffline } from '../../../offline/context.js';
import { deviceName } from '../../../offline/device.js';
import { bringIn, readingsFile, readReadingsFile } from '../../../offline/readings-file.js';

type Said = { readonly tone: 'good' | 'bad'; readonly sentence: string };

const readings = (count: number) => (count === 1 ? '1 entry' : `${count} entries`);

/** The way out where no network comes back: a file, carried to another device and brought in there. */
export function FileWays() {
  const offline = useOffline();
  const chooser = useRef<HTMLInputElement>(null);
  const [said, setSaid] = useState<Said | null>(null);
  const save = async () => {
    await offline.drafts.flush();
    const { operations } = offline.outbox.snapshot();
    const file = readingsFile(operations, offline.drafts.all(), { device: deviceName() });
    offerFile(file.name, new Blob([file.text], { type: 'application/json' }));
    setSaid({ tone: 'good', sentence: `Saved as ${file.name}. It stays here as well until it is sent.` });
  };
  const take = async (file: File) => {
    const read = readReadingsFile(await file.text());
    if (!read.ok) return setSaid({ tone: 'bad', sentence: `${file.name}: ${read.sentence}` });
    const { added, alreadyHere } = await bringIn(offline.store, read.content);
    await Promise.all([offline.outbox.reread(), offline.drafts.reread()]);
    void offline.outbox.send();
    const before = alreadyHere > 0 ? ` ${readings(alreadyHere)} were here already.` : '';
    setSaid({ tone: 'good', sentence: `Brought in ${readings(added)} from ${file.name}.${before}` });
  };
  return (
    <section aria-labelledby="by-file">
      <h2 id="by-file" className="title text-title-25">
        By file
      </h2>
      <p className="mt-1 max-w-text text-table text-ink-2">
        Where the network stays away, save what waits to a file and bring it in on another device. Bringing a
        file in twice changes nothing. Pictures stay on this device.
      </p>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button onClick={() => void save()}>Save readings to a file</Button>
        <Button onClick={() => chooser.current?.click()}>Bring readings in from a file</Button>
        <input
          ref={chooser}
          type="file"
          accept="application/json,.json"
          aria-label="File of readings"
          className="sr-only"
          tabIndex={-1}
          onChange={(event) => {
            const [file] = event.target.files ?? [];
            event.target.value = '';
            if (file) void take(file);
          }}
        />
      </div>
      <p
        role="status"
        className={`mt-3 text-table ${said?.tone === 'bad' ? 'text-madder' : 'text-verdigris'}`}
      >
        {said?.sentence}
      </p>
    </section>
  );
}
