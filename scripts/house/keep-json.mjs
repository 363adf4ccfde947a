import { readFileSync, renameSync, writeFileSync } from 'node:fs';
import { Sentence } from './sentence.mjs';

/** The value of a small file of ours, or undefined when there is none. A damaged one is said, never written over. */
export function readKept(file) {
  let text;
  try {
    text = readFileSync(file, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return undefined;
    throw error;
  }
  try {
    return JSON.parse(text);
  } catch {
    throw new Sentence(`${file} is damaged and cannot be read; put back a copy, or remove it to have it made again, and start once more.`);
  }
}

/** Whole or not at all: a full disk must not leave half a file. Readable by its owner only. */
export function keep(file, value) {
  const next = `${file}.next`;
  writeFileSync(next, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 });
  renameSync(next, file);
}
