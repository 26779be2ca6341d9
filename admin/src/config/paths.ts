/** Every address inside the Workroom, relative to its base `/workroom`. Links are made here and nowhere else. */
export const paths = {
  signIn: (next?: string) =>
    next && next !== '/' ? `/sign-in?next=${encodeURIComponent(next)}` : '/sign-in',
  garments: () => '/',
  newGarment: () => '/garments/new',
  garment: (id: string) => `/garments/${id}`,
  newSheet: (garmentId: string, partId: string) => `/garments/${garmentId}/parts/${partId}/sheets/new`,
  cutSheet: (garmentId: string, partId: string) => `/garments/${garmentId}/parts/${partId}/cut-sheet`,
  partSheets: (garmentId: string, partId: string) => `/garments/${garmentId}/parts/${partId}/sheets`,
  reviewQueue: () => '/review',
  review: (garmentId: string) => `/garments/${garmentId}/review`,
  sheet: (id: string) => `/sheets/${id}`,
  protocols: () => '/protocols',
  /** `version` shows an earlier one. */
  protocol: (
    kind: string,
    { wornTogether = false, version }: { wornTogether?: boolean; version?: number } = {},
  ) => {
    const search = new URLSearchParams({
      ...(wornTogether ? { wornTogether: 'true' } : {}),
      ...(version === undefined ? {} : { version: String(version) }),
    }).toString();
    return `/protocols/${kind}${search && `?${search}`}`;
  },
  repeatability: (from = 'all') => `/repeatability${from === 'all' ? '' : `?from=${from}`}`,
  people: () => '/people',
  tray: () => '/tray',
  audit: () => '/audit',
} as const;

/** The form of a picture that staff see, whatever the public may. */
export const staffPicture = (imageId: string, width: number) =>
  `/api/v1/workroom/images/${imageId}/forms/${width}.jpg`;

/**
 * The way back after signing in. Only an address inside the Workroom counts: a link such as `//elsewhere.example`
 * must not lead anybody away.
 */
export function safeNext(next: string | null): string {
  return next && /^\/(?![/\\])/.test(next) ? next : paths.garments();
}

/** The API's addresses carry the Workroom's base; the router adds it itself. */
export const withinWorkroom = (href: string): string => href.replace(/^\/workroom(?=\/|$)/, '') || '/';
