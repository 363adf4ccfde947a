import type { Page } from '@playwright/test';

/** By the form, as a person would. Ends on the page that the product opens. */
export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await untilFormListens(page);
  await page.getByLabel(/e-?mail/i).fill(email);
  await page.getByLabel(/^password/i).fill(password);
  await page.getByRole('button', { name: /^sign in/i }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** A click in the first instant, before the script has taken the form over, would send it as a plain form. */
const untilFormListens = (page: Page) =>
  page.waitForFunction(() => Object.keys(document.querySelector('form') ?? {}).some((key) => key.startsWith('__reactProps')));
