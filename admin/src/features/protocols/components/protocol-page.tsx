import { isGarmentKind } from '@ellwand/shared/points/kinds';
import type { ProtocolHistory } from '@ellwand/shared/records/protocol';
import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { PrintSheet } from '../../../components/print-sheet.js';
import { ButtonLink } from '../../../components/ui/button.js';
import { Page } from '../../../components/ui/page.js';
import { Empty, Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { useMay } from '../../../lib/session.js';
import { protocolHistoryQuery, type ProtocolName } from '../api/protocols.js';
import { countWords, madeWords, protocolTitle } from '../model/protocol-words.js';
import { ProtocolEditor } from './protocol-editor.js';
import { ProtocolShown } from './protocol-shown.js';
import { VersionList } from './version-list.js';

export function ProtocolPage() {
  const { kind = '' } = useParams();
  const [search] = useSearchParams();
  if (!isGarmentKind(kind)) {
    return (
      <Page title="No such protocol">
        <Empty
          title="Nothing is measured by that name"
          step={<ButtonLink to={paths.protocols()}>All protocols</ButtonLink>}
        />
      </Page>
    );
  }
  const name = { kind, wornTogether: search.get('wornTogether') === 'true' };
  return <ProtocolOf key={`${kind} ${name.wornTogether}`} name={name} />;
}

function ProtocolOf({ name }: { readonly name: ProtocolName }) {
  const [search] = useSearchParams();
  const history = useQuery(protocolHistoryQuery(name));
  const wanted = Number(search.get('version'));
  const shown = history.data?.versions.find(({ version }) => version === wanted) ?? history.data?.versions[0];
  return (
    <Page
      title={protocolTitle(name)}
      lead={shown && `Version ${shown.version}. ${countWords(shown)}. ${madeWords(shown)}.`}
      aside={
        <ButtonLink tone="quiet" to={paths.protocols()}>
          All protocols
        </ButtonLink>
      }
    >
      {history.isPending && <Waiting label="Fetching the protocol" rows={10} />}
      {history.isError && <Failed error={history.error} onRetry={() => void history.refetch()} />}
      {history.data && shown && <Versions history={history.data} shown={shown} />}
    </Page>
  );
}

function Versions({
  history,
  shown,
}: {
  readonly history: ProtocolHistory;
  readonly shown: ProtocolHistory['versions'][number];
}) {
  const writes = useMay('protocol:write');
  const isNewest = shown.version === history.version;
  return (
    <div className="space-y-12">
      {!isNewest && (
        <p className="flex flex-wrap items-center gap-x-4 gap-y-2 rounded-sm border border-rule bg-sheet px-4 py-3 text-table">
          An earlier version. New sheets are taken by version {history.version}.
          <ButtonLink
            height="dense"
            to={paths.protocol(history.kind, { wornTogether: history.wornTogether })}
          >
            Go to version {history.version}
          </ButtonLink>
        </p>
      )}
      {isNewest && !history.wornTogether && (
        <PrintSheet
          path={`/workroom/kinds/${history.kind}/blank-sheet.pdf`}
          label="Blank sheet to print"
          of={protocolTitle(history)}
        />
      )}
      {writes && isNewest ? (
        <ProtocolEditor key={history.kind} history={history} />
      ) : (
        <ProtocolShown protocol={shown} />
      )}
      <VersionList history={history} shown={shown.version} />
    </div>
  );
}
