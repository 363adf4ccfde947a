/** Progress for people: one line a step, with its time; a sign of life when a step is long. */

const isTerminal = process.stdout.isTTY === true;
const signOfLifeMs = isTerminal ? 1_000 : 15_000;

const seconds = (sinceMs) => `${((Date.now() - sinceMs) / 1_000).toFixed(1)} s`;

export const say = (text = '') => process.stdout.write(`${text}\n`);

/**
 * @template T
 * @param {string} title "Starting the database"
 * @param {() => Promise<T> | T} work may return nothing, or a note shown at the end of the line
 * @returns {Promise<T>}
 */
export async function step(title, work) {
  const start = Date.now();
  if (isTerminal) process.stdout.write(`  ${title} ...`);
  const life = setInterval(() => {
    if (isTerminal) process.stdout.write(`\r  ${title} ... ${seconds(start)}`);
    else say(`  ${title}: ${seconds(start)} so far`);
  }, signOfLifeMs);
  try {
    const result = await work();
    finish(title, `${typeof result === 'string' ? `${result}, ` : ''}${seconds(start)}`);
    return result;
  } catch (error) {
    finish(title, 'did not work');
    throw error;
  } finally {
    clearInterval(life);
  }
}

function finish(title, note) {
  if (isTerminal) process.stdout.write(`\r\u001b[K  ${title} (${note})\n`);
  else say(`  ${title} (${note})`);
}
