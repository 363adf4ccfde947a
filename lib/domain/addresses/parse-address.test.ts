import { expect, it } from 'vitest';
import { parseAddress } from './parse-address';

it.each([
  ['10.20.201', 'short', 'has only three parts', '10.20.0.201', null],
  ['127.1', 'short', 'has only two parts', '127.0.0.1', null],
  ['10.20.30.020', 'leading-zero', 'leading zeros', '10.20.30.16', '10.20.30.20'],
  ['10.20.30.08', 'leading-zero', 'leading zeros', null, '10.20.30.8'],
  ['10.20.30.5 ', 'space', 'no spaces', null, '10.20.30.5'],
  ['10.20.30.256', 'too-large', 'at most 255', null, null],
  ['10.20.30.5/24', 'with-mask', 'a field of its own', null, '10.20.30.5'],
  ['10.20.30.5:9100', 'with-port', 'a field of its own', null, '10.20.30.5'],
  ['fe80::1', 'ipv6', 'IPv6', null, null],
  ['', 'empty', 'no address yet', null, null],
  ['0x0a141e05', 'form', 'four numbers', '10.20.30.5', null],
  ['printer.local', 'form', 'four numbers', null, null],
] as const)('says of %j what is wrong, how it would be read, and what was meant', (text, fault, words, reading, instead) => {
  const parsed = parseAddress(text);
  expect(parsed).toMatchObject({ ok: false, fault, reading, instead });
  expect(parsed.ok ? '' : parsed.reason).toContain(words);
  if (reading !== null) expect(parsed.ok ? '' : parsed.reason).toContain(`would read it as ${reading}`);
});
