import iconv from 'iconv-lite';
import { describe, expect, it } from 'vitest';
import { byteOf } from '@/lib/domain/tickets/code-pages';
import { codePages } from '@/lib/domain/site/printer';

const everyCharacter = Array.from({ length: 0x10000 }, (_, codePoint) => codePoint)
  .filter((codePoint) => codePoint < 0xd800 || codePoint > 0xdfff)
  .map((codePoint) => String.fromCodePoint(codePoint));

/** What iconv-lite makes of one character, where it comes back as the same one. */
const referenceByte = (character: string, codePage: string): number | null => {
  const bytes = iconv.encode(character, codePage);
  return bytes.length === 1 && iconv.decode(bytes, codePage) === character ? bytes[0] ?? null : null;
};

describe.each(codePages)('%s', (codePage) => {
  it('has the byte that iconv-lite gives, for every printable character of the basic plane', () => {
    const different = everyCharacter.filter((character) => !/\p{Cc}/u.test(character) && character !== '\ufffd' && byteOf(character, codePage) !== referenceByte(character, codePage));
    expect(different).toEqual([]);
  });

  it('has no byte for a control character', () => {
    expect(everyCharacter.filter((character) => /\p{Cc}/u.test(character) && byteOf(character, codePage) !== null)).toEqual([]);
  });
});

describe('characters that glibc iconv and iconv-lite agree on', () => {
  it.each([
    ['é', [0x82, 0x82, 0x82, 0x82, null, 0xe9]],
    ['ñ', [0xa4, 0xa4, null, 0xa4, null, 0xf1]],
    ['è', [0x8a, 0x8a, null, 0x8a, null, 0xe8]],
    ['€', [null, null, null, 0xd5, null, 0x80]],
    ['ı', [null, 0xd5, null, null, null, null]],
    ['½', [0xab, 0xab, null, 0xab, null, 0xbd]],
    ['Ø', [null, 0x9d, null, 0x9d, null, 0xd8]],
    ['Ő', [null, null, 0x8a, null, null, null]],
    ['Ж', [null, null, null, null, 0x86, null]],
    ['œ', [null, null, null, null, null, 0x9c]],
    ['’', [null, null, null, null, null, 0x92]],
    ['×', [null, 0x9e, 0x9e, 0x9e, null, 0xd7]],
    ['µ', [0xe6, 0xe6, null, 0xe6, null, 0xb5]],
    ['μ', [null, null, null, null, null, null]],
    ['─', [0xc4, 0xc4, 0xc4, 0xc4, 0xc4, null]],
    ['厨', [null, null, null, null, null, null]],
  ] as const)('%s', (character, bytes) => {
    expect(codePages.map((codePage) => byteOf(character, codePage))).toEqual(bytes);
  });
});
