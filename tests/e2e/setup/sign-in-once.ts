import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { chromium, type FullConfig } from '@playwright/test';
import { roles } from '@/lib/domain/roles/permissions';
import { demoPeople as whoCanSignIn } from '@/scripts/house/sign-ins.mjs';
import { keepDemo } from './demo-data';
import { signIn } from './people';
import { keptFolder, keptPeople, stateOf, told, type DemoPerson } from './product';

/** Before all browser tests: one person of each role signs in, then a copy is kept of the demo with these sessions in it. */
export default async function signInOnce(config: FullConfig): Promise<void> {
  rmSync(keptFolder, { recursive: true, force: true });
  mkdirSync(keptFolder, { recursive: true, mode: 0o700 });
  const people = (await whoCanSignIn({ DATABASE_URL: told('DATABASE_URL'), TAMIS_DEMO_PASSWORD: told('TAMIS_DEMO_PASSWORD') })) as readonly DemoPerson[];
  writeFileSync(keptPeople, JSON.stringify(atOneSite(people)));

  const { launchOptions } = config.projects[0]?.use ?? {};
  const browser = await chromium.launch(launchOptions);
  try {
    for (const role of roles) {
      const page = await browser.newPage({ baseURL: told('TAMIS_BASE_URL') });
      await signIn(page, role);
      await page.context().storageState({ path: stateOf(role) });
      await page.close();
    }
  } finally {
    await browser.close();
  }
  await keepDemo();
}

/** The first site that has somebody for every role. */
function atOneSite(people: readonly DemoPerson[]): readonly DemoPerson[] {
  const isComplete = (siteId: string) => roles.every((role) => people.some((person) => person.siteId === siteId && person.role === role));
  const chosen = people.find(({ siteId }) => isComplete(siteId));
  if (!chosen) throw new Error('the demo has no site with a person for every role');
  return people.filter(({ siteId }) => siteId === chosen.siteId);
}
