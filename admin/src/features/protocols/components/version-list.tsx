import { protocolChanges } from '@ellwand/shared/protocols/protocol-changes';
import { type ProtocolHistory, toProtocol } from '@ellwand/shared/records/protocol';
import { Link } from 'react-router-dom';
import { paths } from '../../../config/paths.js';
import { countWords, madeWords } from '../model/protocol-words.js';

/** Every version with who, when, why and what it changed. */
export function VersionList({
  history,
  shown,
}: {
  readonly history: ProtocolHistory;
  readonly shown: number;
}) {
  const { versions, kind, wornTogether } = history;
  return (
    <section aria-labelledby="versions-title" className="max-w-text">
      <h2 id="versions-title" className="title text-title-25">
        Versions
      </h2>
      <ol className="mt-3 border-t border-hair">
        {versions.map((version, index) => {
          const before = versions[index + 1];
          const changes = before ? protocolChanges(toProtocol(before), toProtocol(version)) : [];
          return (
            <li key={version.version} className="border-b border-hair py-4 text-table">
              <h3 className="flex flex-wrap items-baseline gap-x-3 font-semibold">
                Version {version.version}
                <span className="font-normal text-ink-2">{madeWords(version)}</span>
                {version.version === shown ? (
                  <span className="font-normal text-ink-3">shown above</span>
                ) : (
                  <Link
                    to={paths.protocol(kind, { wornTogether, version: version.version })}
                    className="inline-flex min-h-8 items-center font-normal text-indigo underline underline-offset-4"
                  >
                    Show <span className="sr-only">version {version.version}</span>
                  </Link>
                )}
              </h3>
              <p className="figures text-ink-2">{countWords(version)}</p>
              {version.note && <p className="mt-1">{version.note}</p>}
              {changes.length > 0 && (
                <ul className="mt-2 list-disc space-y-0.5 pl-5 text-ink-2">
                  {changes.map((change) => (
                    <li key={change}>{change}</li>
                  ))}
                </ul>
              )}
            </li>
          );
        })}
      </ol>
    </section>
  );
}
