import { plainFileName } from './file-name';

describe('the name of a sent file', () => {
  it.each([
    ['front.jpg', 'front.jpg'],
    ['../../etc/passwd', 'passwd'],
    ['C:\\pictures\\back view.png', 'back view.png'],
    ['a\r\nSet-Cookie: x\0.jpg', 'aSet-Cookie: x.jpg'],
    ['gnp.\u202Etnorf.jpg', 'gnp.tnorf.jpg'],
    ['', 'picture'],
    ['///', 'picture'],
  ])('%j is shown as %j', (sent, shown) => expect(plainFileName(sent)).toBe(shown));

  it('is cut at 200 characters without breaking one', () => {
    expect(plainFileName('👗'.repeat(300))).toBe('👗'.repeat(200));
  });
});
