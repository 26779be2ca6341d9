import { describe, expect, it } from 'vitest';
import { dayText, momentText, timeText, today } from './moments.js';

/** As the browser's own calendar writes it, which is the yardstick here. */
const calendar = (options: Intl.DateTimeFormatOptions) => new Intl.DateTimeFormat('en-GB', options);

describe('moments in words', () => {
  const moments = [new Date(2026, 0, 1, 0, 5), new Date(2026, 11, 31, 23, 59), new Date(2024, 1, 29, 12, 0)];

  it.each(moments)('are written as the calendar writes them: %s', (at) => {
    expect(timeText(at)).toBe(
      calendar({ hour: '2-digit', minute: '2-digit', hour12: false, hourCycle: 'h23' }).format(at),
    );
    expect(dayText(at)).toBe(calendar({ day: 'numeric', month: 'long', year: 'numeric' }).format(at));
    expect(momentText(at.toISOString())).toBe(
      `${calendar({ day: 'numeric', month: 'short', year: 'numeric' }).format(at)}, ${timeText(at)}`,
    );
  });

  it('are of the table’s own day', () => {
    expect(today(new Date(2026, 0, 9, 0, 1))).toBe('2026-01-09');
  });
});
