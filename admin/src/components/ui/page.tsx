import { type ReactNode, useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/** React Router's key of the place where the page was first opened. */
const FIRST_PLACE = 'default';

/**
 * The page's one `h1`. On a change of route it takes the focus and names the window, so that whoever does not see
 * the page hears where they are; on the first load the browser's own start stands.
 */
export function PageTitle({
  title,
  className = '',
  children,
}: {
  readonly title: string;
  readonly className?: string;
  readonly children?: ReactNode;
}) {
  const heading = useRef<HTMLHeadingElement>(null);
  const { key, pathname } = useLocation();
  const shownAt = useRef<string | null>(null);
  useEffect(() => {
    // Another search on the same page is no change of place: it must not take the focus from where one works.
    if (shownAt.current === pathname) return;
    const opened = shownAt.current === null && key === FIRST_PLACE;
    shownAt.current = pathname;
    if (!opened) heading.current?.focus();
  }, [key, pathname]);
  useEffect(() => {
    document.title = `${title} · Ellwand Workroom`;
  }, [title]);
  return (
    <h1 ref={heading} tabIndex={-1} className={`title text-title-34 ${className}`}>
      {children ?? title}
    </h1>
  );
}

/** A page of the office: title, its actions, content at the house's widths. */
export function Page({
  title,
  aside,
  lead,
  children,
}: {
  readonly title: string;
  readonly aside?: ReactNode;
  readonly lead?: ReactNode;
  readonly children: ReactNode;
}) {
  return (
    <div className="mx-auto max-w-page px-4 py-6 sm:px-6 md:py-8">
      <div className="mb-6 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div>
          <PageTitle title={title} />
          {lead && <div className="mt-1 text-table text-ink-2">{lead}</div>}
        </div>
        {aside && <div className="flex flex-wrap gap-2">{aside}</div>}
      </div>
      {children}
    </div>
  );
}
