import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { isUnit } from '../../lib/range-boxes';
import { UNIT_KEY } from './unit-script';

/*
 * The chosen unit lives in an attribute of <html>, where the style sheet reads it: all three are in the page,
 * one is shown. Storage only remembers it for the next page.
 */
const listeners = new Set<() => void>();

export function subscribeToUnit(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function currentUnit(): LengthUnit {
  const unit = document.documentElement.dataset.unit;
  return isUnit(unit) ? unit : 'mm';
}

export function chooseUnit(unit: LengthUnit): void {
  document.documentElement.dataset.unit = unit;
  try {
    localStorage.setItem(UNIT_KEY, unit);
  } catch {
    // A browser that keeps nothing still shows the unit on this page.
  }
  for (const listener of listeners) listener();
}
