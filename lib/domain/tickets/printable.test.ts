import { describe, expect, it } from 'vitest';
import type { CodePage } from '@/lib/domain/site/printer';
import { aTicket, aTicketLine } from '@/tests/fixtures/build-ticket';
import { printable } from './printable';
import { checkTicketText, unprintable } from './unprintable';

describe('words on a printer with few characters', () => {
  it.each<[string, CodePage, string]>([
    ['Crème brûlée', 'cp858', 'CRÈME BRÛLÉE'],
    ['Crème brûlée', 'cp437', 'CRèME BRûLÉE'],
    ['Cre\u0300me', 'cp858', 'CRÈME'],
    ['Crème', 'cp866', 'CREME'],
    ['Smørrebrød', 'cp437', 'SMORREBROD'],
    ['Żurek', 'cp852', 'ŻUREK'],
    ['Żurek', 'cp858', 'ZUREK'],
    ['Борщ', 'cp866', 'БОРЩ'],
    ['Борщ', 'cp858', 'BORSHCH'],
    ['Chef’s cut — rare…', 'cp858', "CHEF'S CUT - RARE..."],
    ['½ dozen', 'cp852', '1/2 DOZEN'],
    ['€ 5', 'cp850', 'EUR 5'],
    ['Großes Bier', 'cp858', 'GROSSES BIER'],
    ['厨房 👩‍🍳', 'cp858', '?? ?'],
  ])('prints %s on %s as %s', (typed, codePage, printed) => {
    expect(printable(typed, codePage, 'capitals').text).toBe(printed);
  });

  it('keeps the case of what is not a dish', () => {
    expect(printable('Till 2', 'cp858', 'as typed').text).toBe('Till 2');
  });

  it.each([
    ['a\u0000b\u001bc\u007fd\u009be', 'abcde'],
    ['a\tb\r\nc\u2028d\u00a0e', 'a b c d e'],
    ['a\u200bb\u202ec\u00add\ud800', 'abcd'],
    ['\u001b[1mbold', '[1mbold'],
  ])('takes commands and invisible characters out of %j', (typed, printed) => {
    expect(printable(typed, 'cp858', 'as typed')).toEqual({ text: printed, replaced: [] });
  });
});

describe('what is said of a character that a printer does not have', () => {
  const ticket = aTicket('Larder', {
    allergies: [{ seat: 1, words: 'орехи' }],
    courses: [{ course: 'Starters', lines: [aTicketLine('Żurek', { note: 'très chaud' })] }],
  });

  it('names the dish, the character and what prints instead, an allergy first', () => {
    const found = unprintable(ticket, { codePage: 'cp858' });
    expect(found.map(({ character, replacement }) => character + replacement)).toEqual(['оO', 'рR', 'еE', 'хKH', 'иI', 'ŻZ']);
    expect(found[0]).toEqual({ character: 'о', replacement: 'O', where: 'орехи', allergy: true });
    expect(found.at(-1)).toEqual({ character: 'Ż', replacement: 'Z', where: 'Żurek', allergy: false });
  });

  it('says nothing where all of it prints', () => {
    expect(unprintable(aTicket('Larder', { courses: [{ course: 'Starters', lines: [aTicketLine('Crème')] }] }), { codePage: 'cp858' })).toEqual([]);
  });

  it('checks one name by itself, for characters and for words that fit on no row', () => {
    expect(checkTicketText('Żurek', { codePage: 'cp858', columns: 32 })).toEqual([{ kind: 'character', character: 'Ż', replacement: 'Z' }]);
    expect(checkTicketText('Donaudampfschifffahrtskapitänsteller', { codePage: 'cp858', columns: 32 }))
      .toEqual([{ kind: 'word-broken', word: 'DONAUDAMPFSCHIFFFAHRTSKAPITÄNSTELLER', columns: 30 }]);
    expect(checkTicketText('House burger', { codePage: 'cp437', columns: 21 })).toEqual([]);
  });
});
