import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { createTransport } from 'nodemailer';
import { describe, expect, onTestFinished, test } from 'vitest';
import { mailName, startMailCatcher, subjectOf } from '@/scripts/house/mail.mjs';
import { freePort } from '@/scripts/house/ports.mjs';
import { scratchFolder } from './scratch-home';

async function catcher() {
  const folder = scratchFolder();
  const said: string[] = [];
  const mail = await startMailCatcher({ folder, port: await freePort(), say: (text: string) => said.push(text) });
  const transport = createTransport(mail.url);
  onTestFinished(async () => {
    transport.close();
    await mail.stop();
  });
  return { folder, said, transport };
}

describe('the mail catcher', () => {
  test('keeps each mail whole as a file and says for whom it is', async () => {
    const { folder, said, transport } = await catcher();
    await transport.sendMail({ from: 'tamis@localhost', to: 'cook@example.org', subject: 'You are invited', text: 'Crème brûlée, "quoted"\n.\nafter a dot' });
    const [file = ''] = readdirSync(folder);
    const text = readFileSync(path.join(folder, file), 'utf8');
    expect(text).toContain('Subject: You are invited');
    expect(text).toContain('after a dot');
    expect(said).toEqual([`Mail for cook@example.org: You are invited (${path.join(folder, file)})`]);
  });

  test('refuses a mail that it cannot keep, so that the sender knows', async () => {
    const { folder, transport } = await catcher();
    rmSync(folder, { recursive: true });
    await expect(transport.sendMail({ from: 'tamis@localhost', to: 'cook@example.org', subject: 'Lost', text: '' })).rejects.toThrow(/could not be kept/);
    expect(existsSync(folder)).toBe(false);
    mkdirSync(folder);
  });
});

test('a folded subject is read as one line, and a subject in the text is not taken for one', () => {
  expect(subjectOf('To: a\r\nSubject: Handover\r\n pack\r\n\r\nSubject: no\r\n')).toBe('Handover pack');
  expect(subjectOf('To: a\r\n\r\nSubject: no\r\n')).toBe('(no subject)');
});

test('mails of one instant have names of their own, in order', () => {
  const now = new Date('2026-12-01T10:00:00.123Z');
  expect([mailName(now, 1), mailName(now, 2)]).toEqual(['2026-12-01T10-00-00-123Z-0001.eml', '2026-12-01T10-00-00-123Z-0002.eml']);
});
