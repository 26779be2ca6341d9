import { type Image, imageViewLabels } from '@ellwand/shared/records/image';
import { useQuery } from '@tanstack/react-query';
import { useFormContext, useWatch } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { Fieldset } from '../../../components/ui/fieldset.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { imagesQuery } from '../../media/api/images.js';
import { noMark, type TypedSheet } from '../model/typed-sheet.js';
import { ChoiceBox } from './boxes.js';
import { PatternDesk } from './pattern-desk.js';

const hint =
  'A drawing on paper, photographed straight from above or scanned. Two marks a known distance apart give its scale.';

/** The hand-drawn pattern: which picture it is, and what is read off it. */
export function PatternFields({
  garmentId,
  disabled,
}: {
  readonly garmentId: string;
  readonly disabled: boolean;
}) {
  const images = useQuery(imagesQuery(garmentId));
  return (
    <Fieldset legend="Hand-drawn pattern" hint={hint}>
      {images.isPending && <Waiting label="Fetching the pictures" rows={1} />}
      {images.isError && <Failed error={images.error} onRetry={() => void images.refetch()} />}
      {images.data && <PatternChoice garmentId={garmentId} images={images.data} disabled={disabled} />}
    </Fieldset>
  );
}

/** Drawings first: they are what is looked for here. */
function choicesOf(images: readonly Image[]): Record<string, string> {
  const named = images.map((image, place) => ({
    image,
    words: `${imageViewLabels[image.view]}, picture ${place + 1}`,
  }));
  const drawings = named.filter(({ image }) => image.view === 'pattern');
  const others = named.filter(({ image }) => image.view !== 'pattern');
  return {
    '': 'None',
    ...Object.fromEntries([...drawings, ...others].map(({ image, words }) => [image.id, words])),
  };
}

function PatternChoice({
  garmentId,
  images,
  disabled,
}: {
  readonly garmentId: string;
  readonly images: readonly Image[];
  readonly disabled: boolean;
}) {
  const { control, getValues, setValue } = useFormContext<TypedSheet>();
  const imageId = useWatch({ control, name: 'pattern.imageId' });
  const image = images.find(({ id }) => id === imageId);
  const choices = choicesOf(images);
  if (imageId !== '' && !image) choices[imageId] = 'A picture that is no longer here';
  // Marks of one picture say nothing in another.
  const clearMarks = () => {
    setValue('pattern.marks', { from: noMark, to: noMark }, { shouldDirty: true });
    setValue(
      'pattern.pairs',
      getValues('pattern.pairs').map((pair) => ({ ...pair, from: noMark, to: noMark })),
      { shouldDirty: true },
    );
  };
  return (
    <>
      <div className="max-w-96" onChange={clearMarks}>
        <ChoiceBox name="pattern.imageId" label="Picture of the pattern" choices={choices} />
      </div>
      {imageId === '' && (
        <p className="text-table text-ink-2">
          Add the drawing to{' '}
          <Link to={paths.garment(garmentId)} className="text-indigo underline underline-offset-4">
            the garment’s pictures
          </Link>{' '}
          as “Hand-drawn pattern”, then choose it here.
        </p>
      )}
      {image && <PatternDesk key={image.id} image={image} disabled={disabled} />}
    </>
  );
}
