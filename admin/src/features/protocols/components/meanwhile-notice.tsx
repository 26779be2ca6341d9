import { protocolChanges } from '@ellwand/shared/protocols/protocol-changes';
import { type ProtocolVersion, toProtocol } from '@ellwand/shared/records/protocol';
import { useEffect, useRef } from 'react';
import { Button } from '../../../components/ui/button.js';
import { momentText } from '../../../lib/moments.js';

/** Says who made a version in between and what it changed; one's own draft stands until one decides otherwise. */
export function MeanwhileNotice({
  base,
  newest,
  onBase,
}: {
  readonly base: ProtocolVersion;
  readonly newest: ProtocolVersion;
  readonly onBase: (version: ProtocolVersion, keepsDraft: boolean) => void;
}) {
  const notice = useRef<HTMLDivElement>(null);
  useEffect(() => notice.current?.focus(), []);
  return (
    <div
      ref={notice}
      tabIndex={-1}
      role="group"
      aria-labelledby="meanwhile-title"
      className="max-w-text rounded-sm border-2 border-logwood bg-sheet p-4 text-table"
    >
      <h3 id="meanwhile-title" className="text-body font-semibold text-logwood">
        {newest.madeBy ?? 'Somebody'} made version {newest.version} while you were at it
      </h3>
      {newest.madeAt && <p className="text-ink-2">{momentText(newest.madeAt)}</p>}
      <ul className="mt-2 list-disc space-y-0.5 pl-5">
        {protocolChanges(toProtocol(base), toProtocol(newest)).map((change) => (
          <li key={change}>{change}</li>
        ))}
      </ul>
      <p className="mt-2">Your draft is kept as it stands.</p>
      <div className="mt-3 flex flex-wrap gap-3">
        <Button onClick={() => onBase(newest, true)}>Go on with mine, after version {newest.version}</Button>
        <Button onClick={() => onBase(newest, false)}>Begin again from version {newest.version}</Button>
      </div>
    </div>
  );
}
