import { homeAt, root } from './home.mjs';
import { end, identify } from './process-table.mjs';
import { launched } from './run.mjs';
import { say } from './say.mjs';
import { sentenceOf } from './sentence.mjs';

/**
 * Runs `work` and undoes what it started, last first, when it is done, when it fails or when somebody asks this process to stop.
 * `work` is given `onStop(undo)` and `fail(sentence)`; it resolves to an exit code to end at once, or to undefined to stay.
 * @param {(house: { onStop: (undo: () => unknown) => void, fail: (sentence: string) => void }) => Promise<number | undefined>} work
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

  whenNpmIsGone(() => {
    say('\nStopping, because npm was stopped.');
    void stop(codeWhenAsked);
  });

  function fail(sentence) {
    if (isStopping) return;
    process.stderr.write(`\n${sentence}\n`);
    void stop(1);
  }

  work({ onStop: (step) => undo.push(step), fail }).then(
    (code) => (code === undefined ? undefined : stop(code)),
    (error) => fail(sentenceOf(error, homeAt(root).folder) ?? error?.stack ?? String(error)),
  );
}

/** Whoever ends npm means this process too, but npm's shell does not always pass the word on: an orphan notices by its parent. */
function whenNpmIsGone(act) {
  if (process.env.npm_lifecycle_event === undefined) return;
  const parent = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(watch);
    act();
  }, 250);
  watch.unref();
}

async function undoOne(step) {
  try {
    await step();
  } catch (error) {
    say(`While stopping: ${error.message}`);
  }
}
