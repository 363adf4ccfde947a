import { expect, it } from 'vitest';
import { ownPath } from './own-path';

it.each([
  ['/sites/lantern-yard/board?plan=dinner', '/sites/lantern-yard/board?plan=dinner'],
  ['/', '/'],
  ['https://elsewhere.example/', '/'],
  ['//elsewhere.example', '/'],
  ['/\\elsewhere.example', '/'],
  ['/\t/elsewhere.example', '/'],
  ['/\n/elsewhere.example', '/'],
  ['/..//elsewhere.example', '/'],
  ['/.//elsewhere.example', '/'],
  ['javascript:alert(1)', '/'],
  ['sites', '/'],
  [null, '/'],
  [undefined, '/'],
])('signing in leads to no other site: %j leads to %s', (wanted, led) => {
  expect(ownPath(wanted)).toBe(led);
});
