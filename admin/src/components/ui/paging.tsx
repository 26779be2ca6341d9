import { Button } from './button.js';

/** Which part of a list this is, in words, and the way on. */
export function Paging({
  page,
  size,
  total,
  onPage,
}: {
  readonly page: number;
  readonly size: number;
  readonly total: number;
  readonly onPage: (page: number) => void;
}) {
  const pages = Math.max(1, Math.ceil(total / size));
  if (pages === 1) return null;
  return (
    <nav aria-label="Pages of the list" className="mt-4 flex items-center justify-between gap-4 text-table">
      <Button disabled={page <= 1} onClick={() => onPage(page - 1)}>
        Previous page
      </Button>
      <span className="figures text-ink-2">
        Page {page} of {pages}
      </span>
      <Button disabled={page >= pages} onClick={() => onPage(page + 1)}>
        Next page
      </Button>
    </nav>
  );
}
