const minuteSeconds = 60;

/** What the answer to a sign-in means, in words; null when it let the person in. `url` is the address that the answer leads to. */
export const refusalWords = (url: string): string | null => {
  const error = new URL(url, 'http://localhost').searchParams.get('error');
  if (error === null) return null;
  const wait = /^wait-(\d+)$/.exec(error)?.[1];
  if (wait !== undefined) {
    const minutes = Math.max(1, Math.ceil(Number(wait) / minuteSeconds));
    return `There were too many wrong passwords, so none is looked at for now. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again.`;
  }
  return error === 'CredentialsSignin'
    ? 'The e-mail and the password do not belong together. Check both, then try again.'
    : 'Signing in did not work this time, and your password was not looked at. Try again in a moment.';
};
