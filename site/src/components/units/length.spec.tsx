import { renderToStaticMarkup } from 'react-dom/server';
import type { ReactNode } from 'react';
import { describe, expect, it } from 'vitest';
import { Length, Spread, Uncertainty } from './length';

/** The words of each unit, as they stand in the page. */
function written(node: ReactNode): Record<string, string> {
  const spans = renderToStaticMarkup(node).matchAll(/data-unit="(\w+)"[^>]*>([^<]*)</g);
  return Object.fromEntries([...spans].map(([, unit = '', text = '']) => [unit, text]));
}

describe('a length in the page', () => {
  it('is there in all three units', () => {
    expect(written(<Length mm="612" />)).toEqual({ mm: '612 mm', cm: '61.2 cm', in: '24 1/8 in' });
  });

  it('stands without its unit where a heading names it', () => {
    expect(written(<Length mm="920.75" bare />)).toEqual({ mm: '920.8', cm: '92.1', in: '36 1/4' });
  });

  it('is in inches no finer than its uncertainty deserves', () => {
    expect(written(<Length mm="1000" uncertaintyMm="1.5" />).in).toBe('39 3/8 in');
    expect(written(<Length mm="1000" uncertaintyMm="5" />).in).toBe('39 1/4 in');
    expect(written(<Length mm="1000" uncertaintyMm="10" />).in).toBe('39 1/2 in');
  });

  it('may be negative, as a difference is', () => {
    expect(written(<Length mm="-12.7" />)).toEqual({ mm: '−12.7 mm', cm: '−1.3 cm', in: '−1/2 in' });
  });
});

describe('an uncertainty in the page', () => {
  it('has a place more than its length, and sixteenths in inches', () => {
    expect(written(<Uncertainty mm="2.4" />)).toEqual({ mm: '2.4', cm: '0.24', in: '1/8' });
  });

  it('is never nothing in inches', () => {
    expect(written(<Uncertainty mm="0.3" />).in).toBe('1/16');
  });
});

describe('the spread of readings in the page', () => {
  it('is not called nothing because a fraction is too coarse', () => {
    expect(written(<Spread mm="1" />)).toEqual({ mm: '1 mm', cm: '0.1 cm', in: '1/16 in' });
    expect(written(<Spread mm="0.5" />).in).toBe('under 1/16 in');
    expect(written(<Spread mm="0" />).in).toBe('0 in');
  });
});
