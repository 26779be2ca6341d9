import { derivations } from '../derivations/registry.js';
import { findMeasuringPoint } from '../points/measuring-points.js';
import type { Protocol } from './protocol.js';

/** Sentences that a new version is answered with. They refuse nothing: every reading more is handling more. */
export function protocolAdvice({ kind, points }: Protocol): readonly string[] {
  const asked = new Set(points.map(({ pointId }) => pointId));
  return derivations.flatMap((derivation) => {
    if (typeof derivation.needs === 'string') return [];
    const needed = derivation.needs.map((need) => need.find((pointId) => asked.has(pointId)));
    const isAsked = asked.has(derivation.id) && derivation.kinds.includes(kind);
    if (!isAsked || needed.includes(undefined)) return [];
    const names = needed.map((pointId) => `“${nameOf(pointId ?? '')}”`).join(' and ');
    return [`“${nameOf(derivation.id)}” can be worked out from ${names}: it need not be measured.`];
  });
}

const nameOf = (pointId: string): string => findMeasuringPoint(pointId)?.name ?? pointId;
