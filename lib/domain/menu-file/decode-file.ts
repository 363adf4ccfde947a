import iconv from 'iconv-lite';

export type Decoded =
  | { readonly ok: true; readonly text: string; readonly encoding: 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252' }
  | { readonly ok: false; readonly message: string };

export const maxFileBytes = 10_000_000;

const startsWith = (bytes: Uint8Array, ...magic: readonly number[]): boolean => magic.every((byte, index) => bytes[index] === byte);

/** First bytes of what people rename to .csv (PKWARE APPNOTE 4.3.7; compound file header of [MS-CFB] 2.2; PDF 32000-1 7.5.2). */
const otherKinds: readonly { readonly magic: readonly number[]; readonly what: string }[] = [
  { magic: [0x50, 0x4b, 0x03, 0x04], what: 'a spreadsheet or an archive' },
  { magic: [0xd0, 0xcf, 0x11, 0xe0], what: 'an old spreadsheet' },
  { magic: [0x25, 0x50, 0x44, 0x46], what: 'a PDF' },
  { magic: [0x1f, 0x8b], what: 'a compressed file' },
];

const tryUtf8 = (bytes: Uint8Array): string | null => {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
};

/**
 * Reads the bytes of a text table: by its byte-order mark, else as UTF-8, else as Windows-1252, which spreadsheets still
 * write. (Node.js 20 decodes that one as Latin-1 and loses the euro, hence the library.)
 */
export const decodeFile = (bytes: Uint8Array): Decoded => {
  if (bytes.length === 0) return { ok: false, message: 'The file is empty. Choose the one that has the menu in it.' };
  if (bytes.length > maxFileBytes) return { ok: false, message: 'The file is larger than 10 MB, which no menu needs. Take out what is not menu, or bring it in as two files.' };
  const other = otherKinds.find(({ magic }) => startsWith(bytes, ...magic));
  if (other !== undefined) return { ok: false, message: `This is ${other.what}, whatever its name ends with. Open it and save it as CSV, then choose that file.` };
  if (startsWith(bytes, 0xff, 0xfe)) return { ok: true, text: new TextDecoder('utf-16le').decode(bytes), encoding: 'utf-16le' };
  if (startsWith(bytes, 0xfe, 0xff)) return { ok: true, text: new TextDecoder('utf-16be').decode(bytes), encoding: 'utf-16be' };
  if (bytes.includes(0)) return { ok: false, message: 'This is not a text file. Open it where it was made and save it as CSV.' };
  const text = tryUtf8(bytes);
  return text === null
    ? { ok: true, text: iconv.decode(bytes as Buffer, 'windows-1252'), encoding: 'windows-1252' }
    : { ok: true, text: text.replace(/^\ufeff/, ''), encoding: 'utf-8' };
};
