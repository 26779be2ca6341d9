import { type HandlingStep, handlingSteps } from '@ellwand/shared/points/point';
import { useState } from 'react';
import { readRemembered, remember } from '../../../lib/remembered.js';

/** The garment is turned once for each handling step; each turning is said once on this device, also after a pause. */
export function useTurning(sheetId: string) {
  const name = `steps.${sheetId}`;
  const [said, setSaid] = useState<readonly HandlingStep[]>(() => {
    const kept = (readRemembered(name) ?? '').split(' ');
    return handlingSteps.filter((step) => kept.includes(step));
  });
  const [asked, setAsked] = useState<HandlingStep | null>(null);

  const askFor = (step: HandlingStep) => {
    if (!said.includes(step)) setAsked(step);
  };
  const done = () => {
    if (!asked) return;
    const next = [...said, asked];
    setSaid(next);
    remember(name, next.join(' '));
    setAsked(null);
  };
  return { asked, askFor, done };
}
