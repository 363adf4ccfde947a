import { homeAt, root } from './home.mjs';
import { end, identify } from './process-table.mjs';
import { launched } from './run.mjs';
import { say } from './say.mjs';
import { sentenceOf } from './sentence.mjs';

/**
 * Runs `work` and undoes what it started, last first, when it is done, when it fails or when somebody asks this process to stop.
 * `work` is given `onStop(undo)` and `stop(code)`; it resolves to an exit code to end at once, or to undefined to stay.
 * @param {(house: { onStop: (undo: () => unknown) => void, stop: (code: number) => Promise<void> }) => Promise<number | undefined>} work
 * @param {{ codeWhenAsked: number }} options the exit code after Ctrl-C: 0 where that is the way to end
 */
export function runUntilStopped(work, { codeWhenAsked }) {
  const undo = [];
  let isStopping = false;

  async function stop(code) {
    if (isStopping) return;
    isStopping = true;
    for (const step of undo.reverse()) await undoOne(step);
    for (const child of launched()) await end(identify(child.pid));
    process.exit(code);
  }

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'])
    process.on(signal, () => {
      if (!isStopping) say('\nStopping.');
      void stop(codeWhenAsked);
    });

  work({ onStop: (step) => undo.push(step), stop }).then(
    (code) => (code === undefined ? undefined : stop(code)),
    (error) => {
      if (isStopping) return;
      process.stderr.write(`\n${sentenceOf(error, homeAt(root).folder) ?? error?.stack ?? error}\n`);
      void stop(1);
    },
  );
}

async function undoOne(step) {
  try {
    await step();
  } catch (error) {
    say(`While stopping: ${error.message}`);
  }
}
