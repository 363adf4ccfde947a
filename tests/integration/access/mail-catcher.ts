import { simpleParser, type ParsedMail } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export type Catcher = { readonly url: string; readonly mails: ParsedMail[]; readonly refuse: (refusing: boolean) => void; readonly stop: () => Promise<void> };

/** Takes mail on a free port of this machine and keeps it for the test to read. */
export const catchMail = async (): Promise<Catcher> => {
  const mails: ParsedMail[] = [];
  let refusing = false;
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    onRcptTo: (_address, _session, done) => done(refusing ? Object.assign(new Error('No such mailbox'), { responseCode: 550 }) : null),
    onData: (stream, _session, done) => {
      void simpleParser(stream).then((mail) => {
        mails.push(mail);
        done();
      });
    },
  });
  await new Promise<void>((resolve) => { server.listen(0, '127.0.0.1', resolve); });
  const address = server.server.address();
  if (address === null || typeof address === 'string') throw new Error('The catcher has no port.');
  return {
    url: `smtp://127.0.0.1:${address.port}`,
    mails,
    refuse: (now) => { refusing = now; },
    stop: () => new Promise((resolve) => { server.close(() => resolve()); }),
  };
};
