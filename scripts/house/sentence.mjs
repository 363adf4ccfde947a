/** A stop that was foreseen: what happened, what it means, what to do. Shown without a stack. */
export class Sentence extends Error {}

const reasons = {
  EACCES: (where) => `Tamis may not write ${where}, so it cannot start; give yourself the right to that folder, or move Tamis to one of your own.`,
  EPERM: (where) => `Tamis may not change ${where}, so it cannot start; give yourself the right to that folder, or move Tamis to one of your own.`,
  EROFS: (where) => `The disk that holds ${where} can only be read, so Tamis cannot start; move Tamis to a disk that can be written.`,
  ENOSPC: (where) => `The disk that holds ${where} is full, so Tamis stopped before changing anything more; free some space and start again.`,
  EDQUOT: (where) => `Your share of the disk that holds ${where} is used up, so Tamis stopped; free some space and start again.`,
  EMFILE: () => 'The system allows Tamis too few open files, so it cannot start; raise the limit with "ulimit -n 4096" and start again.',
};

/**
 * The sentence for an error of the file system, or undefined for one that nobody foresaw.
 * @param {unknown} error
 * @param {string} fallbackPlace names the place when the error does not
 */
export function sentenceOf(error, fallbackPlace) {
  if (error instanceof Sentence) return error.message;
  const code = error instanceof Error && 'code' in error ? String(error.code) : '';
  if (!Object.hasOwn(reasons, code)) return undefined;
  return reasons[code](error.path ?? fallbackPlace);
}
