import type { OwnPointView, ProtocolHistory } from '@ellwand/shared/records/protocol';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { type Draft, withOwnPoint } from '../model/draft.js';
import { useDraft } from '../model/use-draft.js';
import { BandList } from './band-list.js';
import { MakeVersion } from './make-version.js';
import { OwnPointForm } from './own-point-form.js';
import { PointAdder } from './point-adder.js';
import { ProtocolDiagram } from './protocol-diagram.js';

/** Every own point that any version had, as it was defined last. */
const ownPointsOf = ({ versions }: ProtocolHistory): Draft['ownPoints'] =>
  versions.flatMap(({ ownPoints }) => ownPoints);

/** The next version in the making: points dropped, added, put in order, made; each step can be taken back. */
export function ProtocolEditor({ history }: { readonly history: ProtocolHistory }) {
  const [base, setBase] = useState(() => history.versions[0]!);
  const desk = useDraft(base, ownPointsOf(history));
  const [current, setCurrent] = useState<string | null>(null);
  const [making, setMaking] = useState<OwnPointView | 'new' | null>(null);
  if (making !== null) {
    return (
      <OwnPointForm
        draft={desk.draft}
        history={history}
        before={making === 'new' ? null : making}
        onLeave={() => setMaking(null)}
        onMade={(own) => {
          desk.change(
            withOwnPoint(desk.draft, own),
            making === 'new' ? `“${own.name}” made.` : `“${own.name}” changed.`,
          );
          setCurrent(own.id);
          setMaking(null);
        }}
      />
    );
  }
  return (
    <div className="grid gap-8 md:grid-cols-[minmax(0,1fr)_20rem] lg:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="min-w-0 space-y-8">
        <div className="flex min-h-10 flex-wrap items-center gap-x-4 gap-y-2">
          <Button onClick={desk.undo} disabled={desk.last === null}>
            Undo
          </Button>
          <p role="status" className="text-table text-ink-2">
            {desk.last}
          </p>
        </div>
        <BandList desk={desk} current={current} onLight={setCurrent} onDefine={setMaking} />
        <PointAdder desk={desk} onMake={() => setMaking('new')} />
        <MakeVersion
          base={base}
          history={history}
          desk={desk}
          onBase={(version, keepsDraft) => {
            setBase(version);
            if (!keepsDraft) desk.begin(version, ownPointsOf(history));
          }}
        />
      </div>
      <div className="max-md:order-first md:sticky md:top-4 md:self-start">
        <ProtocolDiagram draft={desk.draft} current={current} onChoose={setCurrent} />
      </div>
    </div>
  );
}
