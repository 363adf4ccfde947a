import { expect, it } from 'vitest';
import { isValidMac, parseMac } from './mac';

it.each(['00:1b:44:11:3a:b7', '00-1B-44-11-3A-B7', '001b.4411.3ab7', '001B44113AB7', ' 00:1B:44:11:3A:B7 '])('reads %j the same', (text) => {
  expect(parseMac(text)).toEqual({ ok: true, value: '00:1B:44:11:3A:B7' });
});

it.each([
  ['five pairs', '00:1B:44:11:3A'], ['mixed separators', '00:1B-44:11:3A:B7'], ['a letter beyond F', '00:1B:44:11:3A:G7'], ['nothing', ''],
  ['all zeros', '00:00:00:00:00:00'], ['broadcast', 'FF:FF:FF:FF:FF:FF'], ['a group (IEEE 802)', '01:00:5E:00:00:01'],
])('refuses %s', (_, text) => {
  expect(isValidMac(text)).toBe(false);
});
