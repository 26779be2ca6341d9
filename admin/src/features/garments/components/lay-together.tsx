import type { Garment } from '@ellwand/shared/records/garment';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/ui/button.js';
import { Refused } from '../../../components/ui/states.js';
import { garmentQuery } from '../api/garment.js';
import { layTogether } from '../api/parts.js';

/** For a garment of several parts: what only all of them have together can be measured too. */
export function LayTogether({ garment }: { readonly garment: Garment }) {
  const queries = useQueryClient();
  const lay = useMutation({
    mutationFn: () => layTogether(garment.id, garment.version),
    onSuccess: (next) => queries.setQueryData(garmentQuery(garment.id).queryKey, next),
  });
  if (garment.parts.length < 2 || garment.parts.some(({ wornTogether }) => wornTogether)) return null;
  return (
    <>
      <Button disabled={lay.isPending} onClick={() => lay.mutate()}>
        Measure the parts laid together as worn
      </Button>
      <Refused error={lay.error} />
    </>
  );
}
