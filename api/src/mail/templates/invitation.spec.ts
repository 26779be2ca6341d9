import { invitationLetter } from './invitation';

const facts = {
  to: 'w.oddie@larkmoor.example',
  name: 'Wenna <b>Oddie</b>',
  museum: 'Larkmoor House Museum of Dress',
  invitedBy: 'Tamsin "T" Hale',
  roles: ['recorder', 'desk'] as const,
  link: 'https://larkmoor.example/workroom/invitation#abc',
  expiresAt: new Date('2026-12-08T10:00:00Z'),
};

describe('the letter that invites', () => {
  const letter = invitationLetter(facts);

  it('says who invites, as what, by which link and until when, in both its forms', () => {
    for (const form of [letter.text, letter.html]) {
      expect(form).toContain('as recorder and picture desk');
      expect(form).toContain('https://larkmoor.example/workroom/invitation#abc');
      expect(form).toContain('8 December 2026');
    }
  });

  it('shows markup in a name as it was written', () => {
    expect(letter.html).toContain('Wenna &lt;b&gt;Oddie&lt;/b&gt;');
    expect(letter.html).not.toContain('<b>');
    expect(letter.text).toContain('Wenna <b>Oddie</b>');
  });
});
