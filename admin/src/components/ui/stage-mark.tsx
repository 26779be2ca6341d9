import { type RecordStage, stageLabels } from '@ellwand/shared/records/record-moves';

const looks: Readonly<Record<RecordStage, string>> = {
  draft: 'bg-well text-ink-2',
  'in-review': 'bg-logwood-tint text-logwood',
  approved: 'bg-indigo-tint text-indigo',
  published: 'bg-verdigris-tint text-verdigris',
  withdrawn: 'bg-madder-tint text-madder',
};

/** Where a record stands, in a word; the colour only repeats it. */
export function StageMark({
  stage,
  isPublic = false,
}: {
  readonly stage: RecordStage;
  readonly isPublic?: boolean;
}) {
  return (
    <span
      className={`inline-block whitespace-nowrap rounded-sm px-2 py-0.5 text-label font-medium ${looks[stage]}`}
    >
      {stageLabels[stage]}
      {isPublic && stage !== 'published' ? ', a version is public' : ''}
    </span>
  );
}
