import 'server-only';

type Level = 'info' | 'warn' | 'error';

const write = (level: Level) => (fields: Readonly<Record<string, unknown>>, message: string): void => {
  process.stderr.write(`${JSON.stringify({ at: new Date().toISOString(), level, message, ...fields })}\n`);
};

/** One line of JSON an event; values are encoded, so that nothing a person typed can forge a line. */
export const log = { info: write('info'), warn: write('warn'), error: write('error') };
