import { damageSeenLetter } from './damage-seen';

const facts = {
  to: 'i.thorne@larkmoor.example',
  name: 'Ines Thorne',
  museum: 'Larkmoor House Museum of Dress',
  number: 'LH.1966.30.1',
  part: 'bodice',
  places: [
    { point: 'Armscye', note: 'Silk splitting <20 mm> along the seam.' },
    { point: 'Side seam', note: '' },
  ],
  readBy: 'Odile Marsh',
  keyedBy: 'Wenna Oddie',
  at: new Date('2026-11-20T09:30:00Z'),
  link: 'https://larkmoor.example/workroom/sheets/1',
};

describe('the letter that tells of damage', () => {
  const letter = damageSeenLetter(facts);

  it('says who stopped where, what was noted, who wrote it down and when, in both its forms', () => {
    expect(letter.subject).toBe('Damage seen on LH.1966.30.1');
    for (const form of [letter.text, letter.html]) {
      expect(form).toContain('Odile Marsh stopped measuring LH.1966.30.1, bodice, because damage was seen.');
      expect(form).toContain('Side seam. No note was made.');
      expect(form).toContain('Wenna Oddie wrote it down.');
      expect(form).toContain('20 November 2026');
      expect(form).toContain(facts.link);
    }
    expect(letter.text).toContain('Armscye: Silk splitting <20 mm> along the seam.');
    expect(letter.html).toContain('Silk splitting &lt;20 mm&gt; along the seam.');
  });

  it('does not say twice who it was where one person read and wrote', () => {
    expect(damageSeenLetter({ ...facts, keyedBy: 'Odile Marsh' }).text).not.toContain('wrote it down');
  });
});
