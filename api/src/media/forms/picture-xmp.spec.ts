import { pictureXmp } from './picture-xmp';

describe('what a served picture says of itself', () => {
  it('is that it was rendered, where its caption says so', () => {
    expect(pictureXmp({ caption: 'Front. Rendered; invented garment.' })).toContain(
      'Rendered; invented garment.',
    );
  });

  it('is nothing that somebody may still take out of a draft', () => {
    const xmp = pictureXmp({ caption: 'Given by a family that wants no name. Rendered; invented garment.' });
    expect(xmp).not.toContain('family');
    expect(pictureXmp({ caption: 'A private remark' })).not.toMatch(/private|description/);
  });
});
