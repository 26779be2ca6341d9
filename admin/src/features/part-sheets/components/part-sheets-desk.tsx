import type { PartSheets, SpeakingSheet } from '@ellwand/shared/records/part-sheets';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { chooseSheet, partSheetsQuery } from '../api/part-sheets.js';
import { maySpeak, publishedText, speakingText } from '../model/words.js';
import { ChooseQuestion } from './choose-question.js';
import { SheetsTable } from './sheets-table.js';

interface PartSheetsDeskProps {
  readonly shown: PartSheets;
  /** Why another sheet cannot be chosen now; null where one can. */
  readonly locked: string | null;
}

/** What is published and why, another choice, and every sheet beside the others. */
export function PartSheetsDesk({ shown, locked }: PartSheetsDeskProps) {
  return (
    <>
      <section aria-labelledby="speaking-title" className="mb-6 max-w-text text-table">
        <h2 id="speaking-title" className="text-body font-semibold">
          What is published
        </h2>
        <p className="mt-1">{publishedText(shown)}</p>
        <p className="mt-1">{speakingText(shown)}</p>
        {shown.sheets.filter(maySpeak).length > 1 && <Choosing shown={shown} locked={locked} />}
      </section>
      <SheetsTable shown={shown} />
      <p className="mt-4 max-w-text text-label text-ink-3">
        A change is told against the sheet before it, where it is more than two careful readings may differ.
      </p>
    </>
  );
}

function Choosing({ shown, locked }: PartSheetsDeskProps) {
  const [asking, setAsking] = useState(false);
  const queries = useQueryClient();
  const choose = useMutation({
    mutationFn: (choice: SpeakingSheet) => chooseSheet(shown.partId, shown.version, choice),
    onSuccess: (next) => {
      queries.setQueryData(partSheetsQuery(shown.partId).queryKey, next);
      void queries.invalidateQueries({ queryKey: ['garment', shown.garmentId] });
      setAsking(false);
    },
  });
  if (locked) return <p className="mt-2 text-label text-ink-3 print:hidden">{locked}</p>;
  return (
    <div className="mt-3 print:hidden">
      <Button onClick={() => setAsking(true)}>Choose another sheet</Button>
      <ChooseQuestion
        // What was chosen meanwhile is where the next choice begins.
        key={`${shown.version} ${asking}`}
        shown={shown}
        open={asking}
        onClose={() => {
          choose.reset();
          setAsking(false);
        }}
        pending={choose.isPending}
        error={choose.error}
        onChoose={choose.mutate}
      />
    </div>
  );
}
