// @vitest-environment jsdom
import { hydrateRoot } from 'react-dom/client';
import { renderToString } from 'react-dom/server';
import { act } from 'react';
import { expect, it } from 'vitest';
import { useFollowing } from './use-following';

Object.assign(globalThis, { IS_REACT_ACT_ENVIRONMENT: true });

function Box({ value }: { readonly value: string }) {
  return <input ref={useFollowing<HTMLInputElement>(value)} defaultValue={value} aria-label="From" />;
}

it('keeps what was typed before the page was taken over, and follows the address afterwards', async () => {
  const place = document.createElement('div');
  place.innerHTML = renderToString(<Box value="" />);
  const input = place.querySelector('input');
  if (!input) throw new Error('no box was drawn');
  input.value = '560';
  const root = await act(() => Promise.resolve(hydrateRoot(place, <Box value="" />)));
  expect(input.value).toBe('560');
  await act(() => Promise.resolve(root.render(<Box value="600" />)));
  expect(input.value).toBe('600');
  await act(() => Promise.resolve(root.render(<Box value="" />)));
  expect(input.value).toBe('');
});
