import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { loopback } from './ports.mjs';

const largestBytes = 30_000_000;

/** The subject as a person would read it; folded lines joined (RFC 5322, 2.2.3). Encoded words stay as they are. */
export function subjectOf(message) {
  const head = message.split(/\r?\n\r?\n/, 1)[0].replace(/\r?\n[ \t]+/g, ' ');
  return /^subject:[ \t]*(.*)$/im.exec(head)?.[1] ?? '(no subject)';
}

/** A name that sorts by time and that two mails in one instant do not share. */
export const mailName = (now, count) => `${now.toISOString().replaceAll(/[:.]/g, '-')}-${String(count).padStart(4, '0')}.eml`;

/**
 * Takes every mail that Tamis sends and keeps it as a file: nothing leaves this machine.
 * @param {{ folder: string, port: number, say: (text: string) => void }} options
 */
export async function startMailCatcher({ folder, port, say }) {
  const { SMTPServer } = await import('smtp-server');
  let count = 0;
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: largestBytes,
    onData(stream, session, done) {
      const parts = [];
      stream.on('data', (part) => parts.push(part));
      stream.on('end', () => {
        if (stream.sizeExceeded) return done(Object.assign(new Error('This mail is larger than 30 MB'), { responseCode: 552 }));
        const message = Buffer.concat(parts);
        const file = path.join(folder, mailName(new Date(), (count += 1)));
        try {
          writeFileSync(file, message, { mode: 0o600 });
        } catch (error) {
          return done(Object.assign(new Error(`The mail could not be kept: ${error.message}`), { responseCode: 452 }));
        }
        const to = session.envelope.rcptTo.map(({ address }) => address).join(', ');
        say(`Mail for ${to}: ${subjectOf(message.toString('utf8'))} (${file})`);
        return done();
      });
    },
  });
  server.on('error', (error) => say(`The mail catcher: ${error.message}`));
  await new Promise((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(port, loopback, resolve);
  });
  return { url: `smtp://${loopback}:${port}`, stop: () => new Promise((resolve) => server.close(() => resolve())) };
}
