import { type LengthUnit, lengthUnits, unitLabels } from '@ellwand/shared/units/format-length';
import type { MouseEvent } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { chooseUnit } from './unit-store';
import { useUnit } from './use-unit';

/** Three links that also work without a script: each asks for this page in another unit. */
export function UnitSwitch() {
  const unit = useUnit();
  const { pathname, search } = useLocation();
  const navigate = useNavigate();

  function choose(event: MouseEvent, chosen: LengthUnit) {
    if (event.metaKey || event.ctrlKey || event.shiftKey) return;
    event.preventDefault();
    chooseUnit(chosen);
    const params = new URLSearchParams(search);
    if (!params.has('unit')) return;
    // A unit in the address would win again at the next reload: it goes, the choice is remembered instead.
    params.delete('unit');
    void navigate({ pathname, search: params.toString() }, { replace: true, preventScrollReset: true });
  }

  return (
    <nav aria-label="Unit" className="unit-switch">
      {lengthUnits.map((each) => (
        <a
          key={each}
          href={withUnit(pathname, search, each)}
          aria-current={each === unit ? 'true' : undefined}
          onClick={(event) => choose(event, each)}
        >
          {each}
          <span className="sr-only">: {unitLabels[each]}</span>
        </a>
      ))}
    </nav>
  );
}

function withUnit(pathname: string, search: string, unit: LengthUnit): string {
  const params = new URLSearchParams(search);
  params.set('unit', unit);
  params.sort();
  return `${pathname}?${params.toString()}`;
}
