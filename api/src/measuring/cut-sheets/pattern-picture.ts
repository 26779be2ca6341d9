import type { CutSheetBody, Mark } from '@ellwand/shared/records/cut-sheet';
import { IsNull } from 'typeorm';
import type { ProblemError } from '../../common/problem-error';
import { Refusal } from '../../common/refusal';
import type { Tx } from '../../common/work';
import { ImageRow } from '../../media/image.entity';

type Pattern = NonNullable<CutSheetBody['pattern']>;

/** @throws Refusal 400 where the pattern is no picture of this garment, or a mark lies beside the picture */
export async function refuseStrangePattern(
  tx: Tx,
  garmentId: string,
  pattern: Pattern | null,
): Promise<void> {
  if (!pattern) return;
  const image = await tx.findOne(ImageRow, {
    where: { id: pattern.imageId, garmentId, deletedAt: IsNull() },
  });
  const errors = image
    ? strayMarks(pattern, image)
    : [{ pointer: '/pattern/imageId', detail: unknownPicture }];
  if (errors.length === 0) return;
  throw new Refusal(400, 'cut-sheet.pattern', 'Some of what was sent needs mending.', {}, errors);
}

const unknownPicture = 'Choose one of this garment’s pictures';

function strayMarks(pattern: Pattern, image: ImageRow): ProblemError[] {
  const marks: [string, Mark][] = [
    ['/pattern/marks/from', pattern.marks.from],
    ['/pattern/marks/to', pattern.marks.to],
    ...pattern.pairs.flatMap(({ from, to }, index): [string, Mark][] => [
      [`/pattern/pairs/${index}/from`, from],
      [`/pattern/pairs/${index}/to`, to],
    ]),
  ];
  const { widthPx, heightPx } = image;
  if (widthPx === null || heightPx === null) return [];
  return marks
    .filter(([, { x, y }]) => x > widthPx || y > heightPx)
    .map(([pointer]) => ({ pointer, detail: `The picture is ${widthPx} × ${heightPx} pixels` }));
}
