import { describe, expect, it } from 'vitest';
import { refusalWords } from './refusal-words';

describe('why somebody is not let in', () => {
  it('says nothing to somebody who is', () => {
    expect(refusalWords('http://127.0.0.1:3000/sites')).toBeNull();
  });

  it('does not tell a wrong password from a person it does not know', () => {
    expect(refusalWords('/sign-in?error=CredentialsSignin')).toBe('The e-mail and the password do not belong together. Check both, then try again.');
  });

  it.each([
    [1, 'a minute'],
    [60, 'a minute'],
    [61, '2 minutes'],
    [840, '14 minutes'],
  ])('says after %i seconds of slowing down to wait %s', (seconds, words) => {
    expect(refusalWords(`/sign-in?error=wait-${seconds}`)).toContain(`Wait ${words}, then try again.`);
  });

  it('does not blame the password for a fault of its own', () => {
    expect(refusalWords('/sign-in?error=Configuration')).toContain('your password was not looked at');
  });
});
