import { newId } from '../../../lib/ids.js';
import { noMark, type TypedSheet } from './typed-sheet.js';

type Row<List extends 'pieces' | 'darts' | 'fullness' | 'bones' | 'seams'> = TypedSheet[List][number];

/** What a row holds before anybody types: how many is one, everything else is not known. */
export const blankRows = {
  pieces: (): Row<'pieces'> => ({
    key: newId(),
    name: '',
    count: '1',
    onFold: false,
    grain: 'not-known',
    layer: 'outside',
    widths: { bust: '', waist: '', hip: '', hem: '' },
    note: '',
  }),
  darts: (): Row<'darts'> => ({
    key: newId(),
    piece: '',
    where: '',
    count: '1',
    fromCentre: '',
    centre: 'front',
    tip: '',
    tipSide: 'above',
    length: '',
    intake: '',
  }),
  fullness: (): Row<'fullness'> => ({
    key: newId(),
    where: '',
    kind: 'gathers',
    count: '',
    depth: '',
    direction: 'not-said',
    stitchedDown: '',
    note: '',
  }),
  bones: (): Row<'bones'> => ({
    key: newId(),
    where: '',
    count: '1',
    length: '',
    material: '',
    position: '',
  }),
  seams: (): Row<'seams'> => ({
    key: newId(),
    where: '',
    allowance: '',
    stitching: 'not-known',
    stitchesPer10Mm: '',
    edge: 'not-known',
    note: '',
  }),
  pairs: (): TypedSheet['pattern']['pairs'][number] => ({
    key: newId(),
    name: '',
    from: noMark,
    to: noMark,
  }),
} as const;
