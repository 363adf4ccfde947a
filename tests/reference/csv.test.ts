import { describe, expect, it } from 'vitest';
import { readTable } from '@/lib/domain/menu-file/read-table';
import { makeSafe } from '@/lib/domain/menu-file/safe-cell';

const rowsOf = (text: string): unknown => {
  const reading = readTable(text);
  return reading.ok ? [reading.table.headings, ...reading.table.rows.map((row) => row.cells)] : reading.message;
};

describe('CSV as RFC 4180 section 2 says', () => {
  it.each<[string, string, unknown]>([
    ['1: records on lines of their own', 'aaa,bbb,ccc\r\nzzz,yyy,xxx\r\n', [['aaa', 'bbb', 'ccc'], ['zzz', 'yyy', 'xxx']]],
    ['2: the last line break may be missing', 'aaa,bbb,ccc\r\nzzz,yyy,xxx', [['aaa', 'bbb', 'ccc'], ['zzz', 'yyy', 'xxx']]],
    ['5: quotes around a field', '"aaa","bbb","ccc"\r\nzzz,yyy,xxx', [['aaa', 'bbb', 'ccc'], ['zzz', 'yyy', 'xxx']]],
    ['6: line breaks inside quotes', '"aaa","b\r\nbb","ccc"\r\nzzz,yyy,xxx', [['aaa', 'b\r\nbb', 'ccc'], ['zzz', 'yyy', 'xxx']]],
    ['7: a quote inside is doubled', '"aaa","b""bb","ccc"', [['aaa', 'b"bb', 'ccc']]],
  ])('%s', (_, text, rows) => {
    expect(rowsOf(text)).toEqual(rows);
  });
});

describe('formula characters as the OWASP page on CSV injection and ASVS 5.0 1.2.10 list them', () => {
  it.each(['=1+2";=1+2', '+1', '-18 freezer', '@x', '\tx', '\rx', '\nx', '\0x'])('puts a quote before %j', (cell) => {
    expect(makeSafe(cell)).toBe(`'${cell}`);
  });
});
