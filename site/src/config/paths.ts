/** Every address of the public pages. Links come from here and nowhere else. */
export const paths = {
  home: () => '/',
  search: (query = '') => (query ? `/search?${query}` : '/search'),
  kind: (kind: string) => `/search?kind=${encodeURIComponent(kind)}`,
  garment: (number: string) => `/g/${encodeURIComponent(number)}`,
  version: (number: string, version: number) => `/g/${encodeURIComponent(number)}/v/${version}`,
  howWeMeasure: () => '/how-we-measure',
  /** The bodice stands first, at the address without a kind. */
  kindMeasured: (kind: string) =>
    kind === 'bodice' ? '/how-we-measure' : `/how-we-measure?kind=${encodeURIComponent(kind)}`,
  point: (pointId: string) => `/how-we-measure/${encodeURIComponent(pointId)}`,
  picture: (imageId: string, width: number, format: 'avif' | 'jpg') => `/media/${imageId}/${width}.${format}`,
} as const;
