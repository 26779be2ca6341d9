import { linkedText } from './linked-text';

describe('a letter’s text in the inbox', () => {
  it('lets its addresses be clicked, without the full stop behind them', () => {
    expect(linkedText('Go to https://larkmoor.example/a#b. Then come.')).toBe(
      'Go to <a href="https://larkmoor.example/a#b">https://larkmoor.example/a#b</a>. Then come.',
    );
  });

  it.each([
    ['<script>alert(1)</script>', '&lt;script&gt;alert(1)&lt;/script&gt;'],
    ['javascript:alert(1)', 'javascript:alert(1)'],
    [
      'https://x.example/"onclick="a',
      '<a href="https://x.example/">https://x.example/</a>&quot;onclick=&quot;a',
    ],
    [
      'https://x.example/?a=1&b=2',
      '<a href="https://x.example/?a=1&amp;b=2">https://x.example/?a=1&amp;b=2</a>',
    ],
  ])('never becomes markup of its own: %s', (text, markup) => {
    expect(linkedText(text)).toBe(markup);
  });
});
