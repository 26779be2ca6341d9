import { JSDOM } from 'jsdom';
import { expect, it } from 'vitest';
import { UNIT_KEY, unitScript } from './unit-script';

/** The unit that <html> bears once the script has run, before anything is painted. */
function unitAfter(search: string, remembered: string | null): string | undefined {
  const { window } = new JSDOM(
    `<!doctype html><html data-unit="mm"><head><script>${unitScript}</script></head>`,
    {
      url: `https://larkmoor.example/${search}`,
      runScripts: 'dangerously',
      beforeParse: ({ localStorage }) => {
        if (remembered !== null) localStorage.setItem(UNIT_KEY, remembered);
      },
    },
  );
  return window.document.documentElement.dataset.unit;
}

it.each([
  ['', null, 'mm', 'nothing is said'],
  ['', 'in', 'in', 'inches were chosen before'],
  ['?unit=cm', null, 'cm', 'the address asks for centimetres'],
  ['?unit=cm', 'in', 'cm', 'the address asks for centimetres and inches were chosen before'],
  ['?unit=ell', null, 'mm', 'the address asks for a unit there is not'],
  ['', '<b>', 'mm', 'the memory holds something else'],
])('at %j with %j remembered the page is in %s, since %s', (search, remembered, unit, _why) => {
  expect(unitAfter(search, remembered)).toBe(unit);
});
