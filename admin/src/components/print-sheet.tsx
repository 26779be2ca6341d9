import { useMutation } from '@tanstack/react-query';
import { api } from '../lib/api-client.js';
import { offerFile } from '../lib/offer-file.js';
import { Button } from './ui/button.js';
import { Refused } from './ui/states.js';

const papers = [
  { id: 'a4', label: 'A4' },
  { id: 'letter', label: 'Letter' },
] as const;

/** A measuring sheet for paper, as a file: one button for each size of paper. */
export function PrintSheet({
  path,
  label,
  of,
  height = 'dense',
}: {
  /** The API's address of the file, without its paper. */
  readonly path: string;
  readonly label: string;
  /** What it is a sheet of, for whoever hears the buttons without seeing where they stand. */
  readonly of: string;
  readonly height?: 'dense' | 'table';
}) {
  const print = useMutation({
    mutationFn: (paper: string) => api.file(`${path}?paper=${paper}`),
    onSuccess: ({ name, content }) => offerFile(name, content),
  });
  return (
    <div>
      <div className="flex flex-wrap items-center gap-2 text-table">
        <span aria-hidden="true">{print.isPending ? 'Drawing the pages' : label}</span>
        {papers.map(({ id, label: paper }) => (
          <Button key={id} height={height} disabled={print.isPending} onClick={() => print.mutate(id)}>
            <span className="sr-only">
              {label}, {of},{' '}
            </span>
            {paper}
          </Button>
        ))}
      </div>
      <p role="status" className="sr-only">
        {print.isPending ? 'Drawing the pages' : print.isSuccess ? `${print.data.name} is ready` : ''}
      </p>
      <Refused error={print.error} />
    </div>
  );
}
