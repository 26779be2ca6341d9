import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { fakeApi } from '../../testing/fake-api/fake-api.js';
import { image } from '../../testing/fake-api/garments.js';
import { House } from '../../testing/fake-api/house.js';
import { idOf } from '../../testing/fake-api/people.js';
import { fakeUploads } from '../../testing/fake-upload.js';
import { renderWorkroom } from '../../testing/render-workroom.js';
import { refusedAtOnce } from './use-uploads.js';

const dress = idOf(100);
const picture = (name: string, type = 'image/jpeg') => new File(['cloth'], name, { type });

async function openPictures() {
  const house = new House();
  const uploads = fakeUploads(fakeApi(house));
  const opened = renderWorkroom(`/garments/${dress}`, { house });
  const box = await screen.findByLabelText('Pictures to add');
  return { ...opened, house, uploads, box };
}

describe('pictures on their way', () => {
  it('each show how much has gone, two at a time, then what is being made of them', async () => {
    const { user, uploads, box, house } = await openPictures();
    await user.upload(box, [picture('front.jpg'), picture('back.jpg'), picture('cuff.jpg')]);
    await waitFor(() => expect(uploads.map(({ fileName }) => fileName)).toEqual(['front.jpg', 'back.jpg']));
    act(() => uploads[0]!.progress(3, 4));
    expect(screen.getByRole('progressbar', { name: 'Sending front.jpg' })).toHaveAttribute('value', '75');
    expect(screen.getByRole('progressbar', { name: 'Sending back.jpg' })).toHaveAttribute('value', '0');
    await act(() => uploads[0]!.finish());
    await waitFor(() => expect(uploads).toHaveLength(3));
    expect(
      await screen.findByText('Making smaller forms, 3 of 8', undefined, { timeout: 5000 }),
    ).toBeVisible();
    await waitFor(() => expect(house.garment(dress)?.images.at(-1)?.state).toBe('ready'), { timeout: 8000 });
    const made = house.garment(dress)?.images.at(-1)?.id ?? '';
    await waitFor(() => expect(document.querySelector(`img[src*="${made}"]`)).toBeInTheDocument());
  });

  it('keep the sentence of a refusal beside the file, and can be left out', async () => {
    const { user, uploads, box } = await openPictures();
    await user.upload(box, [picture('broken.jpg'), picture('back.jpg')]);
    await waitFor(() => expect(uploads).toHaveLength(2));
    await act(() => uploads[0]!.finish());
    expect(await screen.findByRole('alert')).toHaveTextContent('it was not copied whole');
    await user.click(screen.getByRole('button', { name: /Leave it out/ }));
    expect(screen.queryByRole('alert')).toBeNull();
    expect(screen.getByRole('progressbar', { name: 'Sending back.jpg' })).toBeInTheDocument();
  });

  it('can be sent again when the network broke off', async () => {
    const { user, uploads, box } = await openPictures();
    await user.upload(box, picture('front.jpg'));
    await waitFor(() => expect(uploads).toHaveLength(1));
    act(() => uploads[0]!.breakOff());
    await user.click(await screen.findByRole('button', { name: /Send again/ }));
    expect(uploads).toHaveLength(2);
  });

  it('are taken by dropping, several at once', async () => {
    const { uploads } = await openPictures();
    const place = screen.getByText(/Drop pictures here/).parentElement!;
    fireEvent.drop(place, { dataTransfer: { files: [picture('a.jpg'), picture('b.jpg')] } });
    await waitFor(() => expect(uploads).toHaveLength(2));
  });

  it('are not sent at all where they cannot be kept', () => {
    expect(refusedAtOnce({ name: 'a.svg', type: 'image/svg+xml', size: 10 })).toMatch(
      /JPEG, PNG, WebP and TIFF/,
    );
    expect(refusedAtOnce({ name: 'a.jpg', type: 'image/jpeg', size: 61 * 1024 * 1024 })).toMatch(/60 MB/);
    expect(refusedAtOnce({ name: 'a.tif', type: '', size: 10 })).toBeNull();
  });
});

describe('a picture', () => {
  it('changes places with its neighbour by a button', async () => {
    const house = new House();
    house.garment(dress)?.images.push(image(777, dress, 1, { view: 'back' }));
    const { user } = renderWorkroom(`/garments/${dress}`, { house });
    expect(await screen.findByRole('button', { name: 'Earlier: Front, picture 1' })).toBeDisabled();
    await user.click(screen.getByRole('button', { name: 'Earlier: Back, picture 2' }));
    expect(await screen.findByRole('button', { name: 'Later: Back, picture 1' })).toBeEnabled();
    expect(house.garment(dress)?.images.map(({ view }) => view)).toEqual(['back', 'front']);
  });

  it('is described, and hidden from the public', async () => {
    const { user, house } = await openPictures();
    await user.click(await screen.findByRole('button', { name: /^Describe/ }));
    await user.selectOptions(screen.getByLabelText('View'), 'Back');
    await user.clear(screen.getByLabelText('Description in words'));
    await user.type(screen.getByLabelText('Description in words'), 'The back, draped');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() =>
      expect(house.garment(dress)?.images[0]).toMatchObject({ view: 'back', alt: 'The back, draped' }),
    );
    await user.click(await screen.findByRole('button', { name: /^Hide/ }));
    expect(await screen.findByText('hidden from the public')).toBeVisible();
  });

  it('is deleted only after the question, which offers hiding', async () => {
    const { user, house } = await openPictures();
    await user.click(await screen.findByRole('button', { name: /^Delete/ }));
    const question = await screen.findByRole('dialog', { name: 'Delete this picture?' });
    expect(question).toHaveTextContent('hide it instead');
    await user.click(within(question).getByRole('button', { name: 'Keep it' }));
    expect(house.garment(dress)?.images).toHaveLength(1);
    await user.click(screen.getByRole('button', { name: /^Delete/ }));
    await user.click(await screen.findByRole('button', { name: 'Delete the picture' }));
    await waitFor(() => expect(house.garment(dress)?.images).toHaveLength(0));
  });
});
