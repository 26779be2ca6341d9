import type { ProtocolList } from '@ellwand/shared/records/protocol';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { KindOutline } from '../../../components/drawing/kind-outline.js';
import { Page } from '../../../components/ui/page.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { protocolsQuery } from '../api/protocols.js';
import { countWords, madeWords, protocolTitle } from '../model/protocol-words.js';

type Listed = ProtocolList['items'][number];

/** What every kind is measured by now. */
export function ProtocolListPage() {
  const protocols = useQuery(protocolsQuery);
  return (
    <Page
      title="Protocols"
      lead="Which points each kind is measured by, in handling order. A sheet keeps the version it was taken by."
    >
      {protocols.isPending && <Waiting label="Fetching the protocols" rows={8} />}
      {protocols.isError && <Failed error={protocols.error} onRetry={() => void protocols.refetch()} />}
      {protocols.data && (
        <ul className="grid gap-px border border-hair bg-hair sm:grid-cols-2 lg:grid-cols-3 xl:grid-cols-4">
          {protocols.data.items.map((protocol) => (
            <Card key={`${protocol.kind} ${protocol.wornTogether}`} protocol={protocol} />
          ))}
        </ul>
      )}
    </Page>
  );
}

function Card({ protocol }: { readonly protocol: Listed }) {
  const { kind, wornTogether, version, note } = protocol;
  return (
    <li className="relative flex gap-4 bg-sheet p-4 hover:bg-paper">
      <KindOutline kind={kind} />
      <div className="min-w-0 text-label text-ink-2">
        <h2 className="text-body font-semibold text-ink">
          <Link
            to={paths.protocol(kind, { wornTogether })}
            className="underline-offset-4 after:absolute after:inset-0 hover:underline"
          >
            {protocolTitle(protocol)}
          </Link>
        </h2>
        <p className="figures">{countWords(protocol)}</p>
        <p className="figures mt-1">Version {version}</p>
        <p>{madeWords(protocol)}</p>
        {note && <p className="mt-1 line-clamp-2 text-ink-3">{note}</p>}
      </div>
    </li>
  );
}
