import type { Garment } from './garment';
import { lh1931n4 } from './lh-1931-4';
import { lh1938n22 } from './lh-1938-22';
import { lh1944n1 } from './lh-1944-1';
import { lh1944n2 } from './lh-1944-2';
import { lh1944n3 } from './lh-1944-3';
import { lh1949n11 } from './lh-1949-11';
import { lh1952n5 } from './lh-1952-5';
import { lh1954n17 } from './lh-1954-17';
import { lh1958n6 } from './lh-1958-6';
import { lh1958n7 } from './lh-1958-7';
import { lh1962n8 } from './lh-1962-8';
import { lh1966n30 } from './lh-1966-30';
import { lh1969n12 } from './lh-1969-12';
import { lh1971n3 } from './lh-1971-3';
import { lh1977n14 } from './lh-1977-14';
import { lh1980n40 } from './lh-1980-40';
import { lh1983n5 } from './lh-1983-5';
import { lh1987n19 } from './lh-1987-19';
import { lh1987n20 } from './lh-1987-20';
import { lh1990n2 } from './lh-1990-2';
import { lh1995n8 } from './lh-1995-8';
import { lh2004n9 } from './lh-2004-9';
import { lh2011n3 } from './lh-2011-3';
import { lh2011n4 } from './lh-2011-4';

/** Every garment of the demonstration, in the order of its list. */
export const garments: readonly Garment[] = [
  lh1931n4,
  lh1954n17,
  lh1962n8,
  lh1938n22,
  lh1971n3,
  lh1949n11,
  lh1966n30,
  lh1983n5,
  lh1990n2,
  lh1977n14,
  lh2004n9,
  lh1958n6,
  lh1958n7,
  lh1944n1,
  lh1944n2,
  lh1944n3,
  lh1980n40,
  lh1969n12,
  lh1952n5,
  lh1987n19,
  lh1987n20,
  lh1995n8,
  lh2011n3,
  lh2011n4,
];
