import type { PublishedImage } from '@ellwand/shared/records/published-garment';

/** What a page says of itself in the head of the document. */
export interface PageHead {
  /** Without the museum's name, which every title ends with. */
  readonly title: string;
  readonly description: string;
  /** Path and query of the one address of this content, without the visitor's unit. */
  readonly canonicalPath: string;
  readonly image?: PublishedImage | null;
  /** Not for search engines: notices, filtered lists without end. */
  readonly unlisted?: boolean;
  /** `Link` header values, such as `<…>; rel="cite-as"`. */
  readonly links?: readonly PageLink[];
}

export interface PageLink {
  readonly rel: string;
  /** A path on this site, or a whole address. */
  readonly href: string;
}

export interface PagePlace {
  readonly url: URL;
  readonly params: Readonly<Record<string, string | undefined>>;
}

/** A route's `handle`: head and status follow from what its loader found. */
export interface PageHandle {
  head(data: unknown, place: PagePlace): PageHead;
  status(data: unknown): number;
}

/** Writes a handle in the terms of one loader's data. */
export function pageHandle<Data>(page: {
  readonly head: (data: Data, place: PagePlace) => PageHead;
  readonly status?: (data: Data) => number;
}): PageHandle {
  return {
    head: (data, place) => page.head(data as Data, place),
    status: (data) => page.status?.(data as Data) ?? 200,
  };
}

interface Match {
  readonly params: PagePlace['params'];
  readonly route: { readonly id: string; readonly handle?: unknown };
}

/** The handle of the deepest route that has one, with that route's data. */
export function pageOf(matches: readonly Match[], data: Readonly<Record<string, unknown>>) {
  const match = [...matches].reverse().find(({ route }) => isPageHandle(route.handle));
  if (!match || !isPageHandle(match.route.handle)) return null;
  return { handle: match.route.handle, data: data[match.route.id], params: match.params };
}

export function isPageHandle(handle: unknown): handle is PageHandle {
  return typeof handle === 'object' && handle !== null && 'head' in handle && 'status' in handle;
}
