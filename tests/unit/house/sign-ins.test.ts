import { expect, test } from 'vitest';
import { tableOfSignIns } from '@/scripts/house/sign-ins.mjs';

const member = (email: string, name: string, role: string, site: string) => ({ email, name, role, site, siteId: site, title: '' });

test('the last words of a start are the people who can sign in, each once, and with what', () => {
  const people = [
    member('mara@lantern.example', 'Mara Quist', 'owner', 'Lantern Yard'),
    member('jo@lantern.example', 'Jo Aldane', 'installer', 'Lantern Yard'),
    member('jo@lantern.example', 'Jo Aldane', 'installer', 'Salt Lane'),
  ];
  expect(tableOfSignIns(people, 'word').split('\n')).toEqual([
    'Sign in as any of these, with the password word',
    '',
    '  mara@lantern.example  Mara Quist  owner at Lantern Yard',
    '  jo@lantern.example    Jo Aldane   installer at Lantern Yard and Salt Lane',
  ]);
});

test('a house without demo people prints no password', () => {
  expect(tableOfSignIns([], 'word')).not.toContain('word');
});
