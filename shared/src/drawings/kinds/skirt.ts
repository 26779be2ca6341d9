import { allRound, alongCurve, straightLine } from '../diagram/layers.js';
import type { GarmentDiagram } from '../diagram/model.js';
import { skirtBack } from './skirt-back.js';
import { skirtFront } from './skirt-front.js';
import { skirtInside } from './skirt-inside.js';

export const skirt: GarmentDiagram = {
  kind: 'skirt',
  title: 'Skirt',
  leastScale: 0.22,
  views: [skirtFront, skirtBack, skirtInside],
  lines: [
    allRound('waistband', 'inside', ['-31,-19---141,-19', '141,-19--31,-19']),
    allRound('high-hip', 'inside', '-166,84--166,84', { sag: 10 }),
    allRound('hip', 'inside', '~hip--hip', { sag: 16 }),
    allRound('hem', 'inside', '~corner{84}..{52}-404,1312..{0}hemBack..{-52}404,1312..{-84}corner', {
      beside: -16,
    }),
    straightLine('hem-depth', 'inside', '-60,1282---60,1388'),
    straightLine('cloth-width', 'inside', '8,860--282,860'),
    straightLine('waist-to-hem-front', 'front', '0,12--0,1036'),
    alongCurve('waist-to-hem-side', 'front', '102,4{62}..{78}160,220{78}..{76}236,640..{72}306,1106'),
    straightLine('waist-to-hem-back', 'back', '-1,8---1,1388'),
    straightLine('opening', 'back', '-24,4---24,262'),
  ],
};
