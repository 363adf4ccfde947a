import { refusalWords } from '../refusal-words';

/** Asks to be let in. Returns why not, in words, or null when the browser now holds the session. */
export const signIn = async (email: string, password: string): Promise<string | null> => {
  const { csrfToken } = (await (await fetch('/api/auth/csrf')).json()) as { csrfToken: string };
  const answer = await fetch('/api/auth/callback/credentials', {
    method: 'POST',
    headers: { 'Content-Type': 'application/x-www-form-urlencoded' },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true', callbackUrl: location.origin }),
  });
  const { url } = (await answer.json()) as { url: string };
  return refusalWords(url);
};
