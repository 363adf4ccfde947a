import { chromium, type BrowserContext, type Page } from '@playwright/test';
import { demoPeople as whoCanSignIn } from '@/scripts/house/sign-ins.mjs';
import type { Figure } from './figure';
import { demoPages } from '../e2e/setup/pages';
import { signIn } from '../e2e/setup/sign-in';
import { told, type DemoPerson } from '../e2e/setup/product';

const goalKilobytes = (page: string): number => (page.endsWith('/board') ? 190 : 150);

type Script = { readonly path: string; readonly bytes: number };

/** The scripts that the browser has by now, as they came over the wire (gzip). */
const scriptsOf = (page: Page): Promise<readonly Script[]> =>
  page.evaluate(() =>
    performance
      .getEntriesByType('resource')
      .filter((entry): entry is PerformanceResourceTiming => entry instanceof PerformanceResourceTiming && new URL(entry.name).pathname.endsWith('.js'))
      .map((entry) => ({ path: new URL(entry.name).pathname, bytes: entry.encodedBodySize })),
  );

/** Until a second passes in which no script came: some pages keep a connection open, so the network never rests. */
async function settledScripts(page: Page): Promise<readonly Script[]> {
  for (let before = -1; ; ) {
    const scripts = await scriptsOf(page);
    if (scripts.length === before) return scripts;
    before = scripts.length;
    await page.waitForTimeout(1_000);
  }
}

/** Every script of one visit, told apart by whether the document itself asks for it. Undefined for a page that only leads to another. */
async function weigh(context: BrowserContext, address: string): Promise<{ readonly first: number; readonly later: number } | undefined> {
  const page = await context.newPage();
  try {
    const answer = await page.goto(address, { waitUntil: 'load' });
    if (!answer || answer.status() !== 200) throw new Error(`${address} answered ${answer?.status() ?? 'nothing'}`);
    if (new URL(page.url()).pathname !== address) return undefined;
    const document = await answer.text();
    const once = [...new Map((await settledScripts(page)).map((script) => [script.path, script])).values()];
    const asked = once.filter(({ path }) => document.includes(path.split('/').slice(-2).join('/')));
    const total = (some: readonly Script[]) => some.reduce((sum, { bytes }) => sum + bytes, 0);
    return { first: total(asked), later: total(once) - total(asked) };
  } finally {
    await page.close();
  }
}

const kilobytes = (bytes: number): number => Math.round(bytes / 100) / 10;

/** As the owner, who sees every page, with an empty cache for each. */
const bench = async (): Promise<readonly Figure[]> => {
  const people = (await whoCanSignIn({ DATABASE_URL: told('DATABASE_URL'), TAMIS_DEMO_PASSWORD: told('TAMIS_DEMO_PASSWORD') })) as readonly DemoPerson[];
  const owner = people.find(({ role }) => role === 'owner');
  if (!owner) throw new Error('the demo has no owner');
  const baseURL = told('TAMIS_BASE_URL');
  const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'] });
  try {
    const door = await browser.newContext({ baseURL });
    const page = await door.newPage();
    await signIn(page, owner.email, told('TAMIS_DEMO_PASSWORD'));
    const storageState = await door.storageState();

    const figures: Figure[] = [];
    for (const { name, address, atTheDoor } of await demoPages(owner.siteId)) {
      const context = await browser.newContext({ baseURL, ...(atTheDoor ? {} : { storageState }) });
      const weight = await weigh(context, address);
      await context.close();
      if (!weight) continue;
      const { first, later } = weight;
      const goal = goalKilobytes(name);
      figures.push({ name: `script at first paint, ${name}`, value: kilobytes(first), unit: 'kB gzip', goal: `<= ${goal}`, holds: kilobytes(first) <= goal });
      if (later > 0) figures.push({ name: `script after first paint, ${name}`, value: kilobytes(later), unit: 'kB gzip', goal: 'told apart', holds: true });
    }
    return figures;
  } finally {
    await browser.close();
  }
};

export default bench;
