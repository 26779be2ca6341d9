import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { protocolFaults } from '@ellwand/shared/protocols/protocol-rules';
import { type OwnPointView, type ProtocolHistory, toProtocol } from '@ellwand/shared/records/protocol';
import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useRef } from 'react';
import { Controller, useForm, useWatch } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { mistakesOf } from '../../../lib/form-mistakes.js';
import { type Draft, protocolOf, ready, withOwnPoint } from '../model/draft.js';
import {
  boxOf,
  OwnPointForm as Schema,
  ownPointFrom,
  type OwnPointRead,
  type OwnPointTyped,
  typedFrom,
} from '../model/own-point-form.js';
import { LineDesk } from './line-desk.js';
import { AdviceFields, KeptMeaning, MeaningFields } from './own-point-fields.js';

interface OwnPointFormProps {
  readonly draft: Draft;
  readonly history: ProtocolHistory;
  /** The point to better; null for a new one. */
  readonly before: OwnPointView | null;
  readonly onMade: (own: OwnPointView) => void;
  readonly onLeave: () => void;
}

/** Makes a measuring point of the museum's own: what it is, and its line on the diagram. */
export function OwnPointForm({ draft, history, before, onMade, onLeave }: OwnPointFormProps) {
  const title = useRef<HTMLHeadingElement>(null);
  useEffect(() => title.current?.focus(), []);
  const views = (diagramFor(draft.kind)?.views ?? []).map(({ name }) => name);
  const firstView = views.find((name) => name === 'inside') ?? views[0] ?? 'front';
  const form = useForm<OwnPointTyped, unknown, OwnPointRead>({
    resolver: zodResolver(Schema),
    defaultValues: typedFrom(before, firstView),
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;
  const typed = useWatch({ control: form.control });
  const taken = draft.ownPoints.map(({ id }) => id);
  // A reading taken by an earlier version must go on meaning the same.
  const isKept = history.versions.some(({ ownPoints }) => ownPoints.some(({ id }) => id === before?.id));

  const submit = form.handleSubmit((read) => {
    const own = ownPointFrom(read, before?.id ?? null, taken);
    const next = ready(withOwnPoint(draft, own));
    const at = `/ownPoints/${next.ownPoints.findIndex(({ id }) => id === own.id)}/`;
    const faults = protocolFaults(protocolOf(next), history.versions.map(toProtocol)).filter(({ pointer }) =>
      pointer.startsWith(at),
    );
    for (const { pointer, detail } of faults) {
      form.setError(boxOf(pointer) ?? 'root.server', { type: 'rule', message: detail });
    }
    if (faults.length === 0) onMade(own);
  });

  return (
    <form
      noValidate
      onSubmit={(event) => void submit(event)}
      aria-labelledby="own-title"
      className="space-y-6"
    >
      <div>
        <h2 ref={title} id="own-title" tabIndex={-1} className="title text-title-28">
          {before ? before.name : 'A point of our own'}
        </h2>
        {isKept && (
          <p className="mt-1 max-w-text text-table text-ink-2">
            It stands in an earlier version, so it keeps its meaning: its line, its usual range and what to
            watch for may be bettered. For anything else, drop it and make a new point.
          </p>
        )}
      </div>
      <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
      <div className="grid gap-8 lg:grid-cols-2">
        <div className="space-y-5">
          {isKept ? <KeptMeaning form={form} /> : <MeaningFields form={form} />}
          <AdviceFields form={form} />
        </div>
        <Controller
          control={form.control}
          name="line"
          render={({ field }) => (
            <LineDesk
              draft={draft}
              own={shownPoint(typed, field.value, before)}
              onChange={field.onChange}
              error={errors.line?.along?.message ?? errors.line?.along?.root?.message}
            />
          )}
        />
      </div>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="action">
          {before ? 'Keep the changes' : 'Put it in the protocol'}
        </Button>
        <Button onClick={onLeave}>{before ? 'Leave it as it was' : 'Leave it out'}</Button>
      </div>
    </form>
  );
}

/** The point as far as it is written, so that its line can be looked at while it is drawn. */
function shownPoint(
  typed: Partial<Omit<OwnPointTyped, 'line'>>,
  line: OwnPointView['line'],
  before: OwnPointView | null,
): OwnPointView {
  return {
    id: before?.id ?? 'own-in-the-making',
    group: before?.group ?? 'opening',
    name: typed.name || 'New point',
    ...{ definition: '', from: '', to: '', watchFor: '', range: null },
    ...{ takesTapeLengths: false, levelRecorded: false, paired: false },
    side: typed.side ?? 'inside',
    how: typed.how ?? 'straight',
    handlingStep: typed.handlingStep ?? 'opened-inside',
    line,
  };
}
