/** Whose catalogue this is. */
export const museum = {
  name: 'Larkmoor House Museum of Dress',
  catalogueName: 'The measured catalogue',
  email: 'catalogue@larkmoor.example',
} as const;
