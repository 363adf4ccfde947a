import { test as base, type Page } from '@playwright/test';
import type { Role } from '@/lib/domain/roles/permissions';
import { restoreDemo } from './demo-data';
import { personWith, stateOf, told } from './product';
import { signIn as signInWith } from './sign-in';

export { expect, type Page } from '@playwright/test';
export { personWith } from './product';

/**
 * Each test begins with the demo as it was seeded. `test.use({ role: 'chef' })` begins it signed in;
 * without a role it begins at the door.
 */
export const test = base.extend<{ role: Role | undefined; demo: void }>({
  role: [undefined, { option: true }],
  storageState: async ({ role }, use) => use(role ? stateOf(role) : undefined),
  demo: [
    async ({}, use) => {
      await restoreDemo();
      await use();
    },
    { auto: true },
  ],
});

/** At the door, as the demo's person with this role. */
export const signIn = (page: Page, role: Role): Promise<void> => signInWith(page, personWith(role).email, told('TAMIS_DEMO_PASSWORD'));

/** Where a page of the demo site is: `sitePage('chef', 'board')`. */
export const sitePage = (role: Role, page = ''): string => `/sites/${personWith(role).siteId}${page ? `/${page}` : ''}`;
