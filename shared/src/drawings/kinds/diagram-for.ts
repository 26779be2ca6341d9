import type { GarmentKind } from '../../points/kinds.js';
import type { GarmentDiagram } from '../diagram/model.js';
import { glove, hat, shoe } from './accessories.js';
import { bodice } from './bodice.js';
import { bustle } from './bustle.js';
import { cape } from './cape.js';
import { chemise } from './chemise.js';
import { childDress } from './child-dress.js';
import { coat } from './coat.js';
import { corset } from './corset.js';
import { crinoline } from './crinoline.js';
import { dress } from './dress.js';
import { jacket } from './jacket.js';
import { petticoat } from './petticoat.js';
import { shirt } from './shirt.js';
import { skirt } from './skirt.js';
import { breeches, trousers } from './trousers.js';
import { waistcoat } from './waistcoat.js';

const diagrams: ReadonlyMap<string, GarmentDiagram> = new Map(
  [
    dress,
    bodice,
    skirt,
    coat,
    jacket,
    waistcoat,
    trousers,
    breeches,
    cape,
    shirt,
    chemise,
    corset,
    crinoline,
    bustle,
    petticoat,
    childDress,
    hat,
    glove,
    shoe,
  ].map((diagram) => [diagram.kind, diagram]),
);

/** A kind's measuring diagram; undefined for what has none, such as a set: a sheet then works by its table alone. */
export const diagramFor = (kind: string): GarmentDiagram | undefined => diagrams.get(kind);

export const drawnKinds: readonly GarmentKind[] = [...diagrams.values()].map((diagram) => diagram.kind);
