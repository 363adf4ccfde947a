import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { chromium, type FullConfig } from '@playwright/test';
import { roles } from '@/lib/domain/roles/permissions';
import { demoPeople as whoCanSignIn } from '@/scripts/house/sign-ins.mjs';
import { keepDemo } from './demo-data';
import { signIn } from './people';
import { keptFolder, keptPeople, stateOf, told, type DemoPerson } from './product';

/** Before all browser tests: keeps a copy of the demo, and the cookies of one person for each role. */
export default async function signInOnce(config: FullConfig): Promise<void> {
  rmSync(keptFolder, { recursive: true, force: true });
  mkdirSync(keptFolder, { recursive: true, mode: 0o700 });
  await keepDemo();

  const people = (await whoCanSignIn({ DATABASE_URL: told('DATABASE_URL'), TAMIS_DEMO_PASSWORD: told('TAMIS_DEMO_PASSWORD') })) as readonly DemoPerson[];
  writeFileSync(keptPeople, JSON.stringify(largerSite(people)));

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
}

function largerSite(people: readonly DemoPerson[]): readonly DemoPerson[] {
  const rolesAt = (siteId: string) => new Set(people.filter((person) => person.siteId === siteId).map(({ role }) => role)).size;
  const [largest] = [...people].sort((one, other) => rolesAt(other.siteId) - rolesAt(one.siteId));
  return people.filter(({ siteId }) => siteId === largest?.siteId);
}
