import { placeAfterKey } from '@/components/ui/rove';
import { fullTimeWords, timeWords } from '@/components/ui/time-words';

test('arrow keys walk around, Home and End go to the ends, other keys mean nothing', () => {
  expect(placeAfterKey('ArrowRight', 2, 3)).toBe(0);
  expect(placeAfterKey('ArrowLeft', 0, 3)).toBe(2);
  expect(placeAfterKey('ArrowDown', 0, 3)).toBe(1);
  expect(placeAfterKey('Home', 2, 3)).toBe(0);
  expect(placeAfterKey('End', 0, 3)).toBe(2);
  expect(placeAfterKey('a', 0, 3)).toBeUndefined();
  expect(placeAfterKey('ArrowRight', 0, 0)).toBeUndefined();
});

test('a moment is shown in the zone of its reader, and its title names the zone', () => {
  const iso = '2026-11-30T23:12:00Z';
  expect(timeWords(iso, 'clock', 'UTC')).toBe('23:12');
  expect(timeWords(iso, 'clock', 'Asia/Kathmandu')).toBe('04:57');
  expect(timeWords(iso, 'day', 'Asia/Kathmandu')).toBe('1 Dec 2026');
  expect(fullTimeWords(iso, 'UTC')).toMatch(/Monday.*30 November 2026.*23:12:00 UTC/);
});

test('midnight reads 00:00, and what is no date is given back as it came', () => {
  expect(timeWords('2026-01-01T00:00:00Z', 'clock', 'UTC')).toBe('00:00');
  expect(timeWords('soon', 'moment')).toBe('soon');
});
