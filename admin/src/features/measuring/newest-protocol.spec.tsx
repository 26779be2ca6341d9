import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { trainLoop } from '../../testing/fake-api/protocols.js';
import { bodiceSheetId, skirtSheetId } from '../../testing/fake-api/sheets.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

/** A house in which a version of both protocols was made after their sheets were opened. */
function houseWithNewer(): House {
  const house = new House();
  for (const sheet of house.sheets) sheet.newestProtocolVersion = 2;
  return house;
}

async function openSheet(id: string, house = houseWithNewer()) {
  const opened = renderWorkroom(`/sheets/${id}`, { house });
  await opened.user.click(await screen.findByRole('button', { name: /We have read this/ }));
  await opened.user.click(await screen.findByRole('button', { name: /It lies so/ }));
  await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
  return opened;
}

describe('a newer version of the protocol', () => {
  it('is offered on a sheet without readings, and brings its points and lines', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    expect(screen.queryByLabelText(/^Band to train loop,/)).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Take version 2' }));
    expect(await screen.findByLabelText(/^Band to train loop,/)).toBeInTheDocument();
    expect(house.sheet(skirtSheetId)).toMatchObject({ protocolVersion: 2 });
    expect(screen.queryByRole('button', { name: /Take version/ })).toBeNull();
    await user.click(screen.getByLabelText(/^Band to train loop,/));
    const diagram = within(screen.getByRole('region', { name: 'Diagram' }));
    expect(diagram.getByRole('button', { name: 'Inside' })).toHaveAttribute('aria-pressed', 'true');
    const letter = `[data-point="${trainLoop.id}"] .drawing-letter-current`;
    await waitFor(() => expect(document.querySelector(letter)?.textContent).toBe('D'));
    expect(diagram.getByText(/From the lower edge of the waistband at centre back/)).toBeVisible();
  });

  it('says why where somebody has written on the sheet since', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    house.sheet(skirtSheetId)!.version += 1;
    await user.click(screen.getByRole('button', { name: 'Take version 2' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Somebody saved in between.');
    expect(house.sheet(skirtSheetId)?.protocolVersion).toBe(1);
  });

  it('is not offered once something has been read', async () => {
    await openSheet(bodiceSheetId);
    expect(screen.queryByRole('button', { name: /Take version/ })).toBeNull();
  });
});
