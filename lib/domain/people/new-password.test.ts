import { describe, expect, it } from 'vitest';
import { faultOfNewPassword } from './new-password';

const owner = { name: 'Ines Okafor', email: 'ines@lanternyard.example' };

describe('a new password', () => {
  it.each([
    'copper kettle at noon', 'tr0ub4dor&3-x', 'aaaaaabbbcde', 'ααβγδεζηθικλ', 'サーモンと白ワインの夜に', 'Sommer im Garten 1', 'x'.repeat(60) + 'ywvz', 'inesokafor-and-8-more',
  ])('can be %s: its length is what counts', (password) => expect(faultOfNewPassword(password, owner)).toBeNull());

  it.each([
    ['', '12 characters; this one has 0'], ['elevenchars', 'this one has 11'], ['🧅'.repeat(11), 'this one has 11'], [`${'long words '.repeat(30)}`, 'at most 256'],
    ['Password1234', 'tried first'], ['passwordpassword', 'tried first'], ['!!!Welcome2026', 'tried first'], ['ｐａｓｓｗｏｒｄ1234', 'tried first'], ['123456789012', 'tried first'], ['aaaaaaaaaaaa', 'tried first'],
    ['121212121212', 'tried first'], ['headchef2026', 'tried first'], ['InesOkafor2026', 'your own name'], ['ines ines ines', 'your own name'], ['ines@lanternyard.example', 'your own name'],
  ])('cannot be %s', (password, reason) => expect(faultOfNewPassword(password, owner)).toContain(reason));
});
