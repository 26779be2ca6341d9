import { type GarmentKind } from '../../points/kinds.js';
import { type GarmentDiagram } from '../diagram/model.js';
import { bodice } from './bodice.js';
import { dress } from './dress.js';
import { skirt } from './skirt.js';

const diagrams: Readonly<Partial<Record<GarmentKind, GarmentDiagram>>> = { bodice, dress, skirt };

/** The measuring diagram of a kind, or undefined where none is drawn yet. */
export const diagramFor = (kind: GarmentKind): GarmentDiagram | undefined => diagrams[kind];

export const drawnKinds = Object.keys(diagrams) as readonly GarmentKind[];
