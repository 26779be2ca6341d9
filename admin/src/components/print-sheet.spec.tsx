import { screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { House } from '../testing/fake-api/house.js';
import { staff } from '../testing/fake-api/people.js';
import { skirtSheetId } from '../testing/fake-api/sheets.js';
import { renderWorkroom } from '../testing/render-workroom.js';

const pdf = () =>
  new Response('%PDF-1.7', {
    headers: {
      'Content-Type': 'application/pdf',
      'Content-Disposition': 'inline; filename="measuring-sheet-LH.1966.30b-2026-11-20.pdf"',
    },
  });

describe('a sheet for paper', () => {
  let offered: string[];

  beforeEach(() => {
    offered = [];
    vi.stubGlobal(
      'URL',
      Object.assign(URL, { createObjectURL: () => 'blob:sheet', revokeObjectURL: () => undefined }),
    );
    vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (this: HTMLAnchorElement) {
      offered.push(this.download);
    });
  });
  afterEach(() => {
    vi.restoreAllMocks();
    vi.unstubAllGlobals();
  });

  it('is asked for by its paper and offered by the name that the API gives it', async () => {
    const asked: string[] = [];
    const { user } = renderWorkroom(`/protocols/skirt`, {
      house: new House(staff.recorder),
      intercept: ({ url }) => {
        if (!url.includes('.pdf')) return undefined;
        asked.push(url);
        return Promise.resolve(pdf());
      },
    });
    await user.click(await screen.findByRole('button', { name: /^Blank sheet to print, Skirts, *Letter$/ }));
    expect(
      await screen.findByText(/^measuring-sheet-LH\.1966\.30b-2026-11-20\.pdf is ready$/),
    ).toBeInTheDocument();
    expect(asked).toEqual([
      expect.stringMatching(/\/workroom\/kinds\/skirt\/blank-sheet\.pdf\?paper=letter$/),
    ]);
    expect(offered).toEqual(['measuring-sheet-LH.1966.30b-2026-11-20.pdf']);
  });

  it('says so where it cannot be had', async () => {
    const { user } = renderWorkroom(`/sheets/${skirtSheetId}`, {
      intercept: ({ url }) =>
        url.includes('.pdf') ? Promise.reject(new TypeError('no network')) : undefined,
    });
    await user.click(await screen.findByRole('button', { name: /We have read this/ }));
    await user.click(await screen.findByRole('button', { name: /It lies so/ }));
    await user.click(await screen.findByRole('tab', { name: 'Facts' }));
    await user.click(await screen.findByRole('button', { name: /^This sheet to print, .*A4$/ }));
    expect(await screen.findByText(/server did not answer/)).toBeVisible();
    expect(offered).toEqual([]);
  });
});
