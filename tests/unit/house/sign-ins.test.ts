import { expect, test } from 'vitest';
import { tableOfSignIns } from '@/scripts/house/sign-ins.mjs';

test('the last words of a start are the people who can sign in, and with what', () => {
  const people = [
    { email: 'mara@lantern.example', name: 'Mara Quist', role: 'owner', site: 'Lantern Yard', siteId: 'lantern-yard', title: '' },
    { email: 'jo@lantern.example', name: 'Jo Aldane', role: 'installer', site: 'Lantern Yard', siteId: 'lantern-yard', title: '' },
  ];
  expect(tableOfSignIns(people, 'word').split('\n')).toEqual([
    'Sign in as any of these, with the password word',
    '',
    '  mara@lantern.example  Mara Quist  owner      Lantern Yard',
    '  jo@lantern.example    Jo Aldane   installer  Lantern Yard',
  ]);
});

test('a house without demo people prints no password', () => {
  expect(tableOfSignIns([], 'word')).not.toContain('word');
});
