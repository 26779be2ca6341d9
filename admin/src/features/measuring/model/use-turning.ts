import { type HandlingStep, handlingSteps } from '@ellwand/shared/points/point';
import { useState } from 'react';
import { readRemembered, remember } from '../../../lib/remembered.js';

interface Turn {
  readonly step: HandlingStep;
  /** The row that the work goes on at. */
  readonly to: string;
}

/** The garment is turned once for each handling step; each turning is said once on this device, also after a pause. */
export function useTurning(sheetId: string) {
  const name = `steps.${sheetId}`;
  const [said, setSaid] = useState<readonly HandlingStep[]>(() => {
    const kept = (readRemembered(name) ?? '').split(' ');
    return handlingSteps.filter((step) => kept.includes(step));
  });
  const [asked, setAsked] = useState<Turn | null>(null);

  const mayGo = (step: HandlingStep, to: string): boolean => {
    if (said.includes(step)) return true;
    setAsked({ step, to });
    return false;
  };
  const done = (): string | null => {
    if (!asked) return null;
    const next = [...said, asked.step];
    setSaid(next);
    remember(name, next.join(' '));
    setAsked(null);
    return asked.to;
  };
  return { asked, mayGo, done };
}
