import AxeBuilder from '@axe-core/playwright';
import { demoPages } from './setup/pages';
import { expect, personWith, test } from './setup/people';

const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

test.describe('every page', () => {
  test.use({ role: 'owner' });

  test('can be used by anybody: axe finds nothing, nothing runs off the side, nothing fails @widths', async ({ page }) => {
    test.setTimeout(240_000);
    const failures = new Set<string>();
    page.on('pageerror', (error) => failures.add(`${page.url()}: ${error.message}`));
    page.on('console', (message) => message.type() === 'error' && failures.add(`${page.url()}: ${message.text()} ${message.location().url}`));

    for (const { name, address } of await demoPages(personWith('owner').siteId))
      await test.step(name, async () => {
        await page.goto(address);
        await expect.soft(page.getByRole('heading', { level: 1 }), `${name} has one heading that names it`).toHaveCount(1);
        await expect.soft(page, `${name} has a title`).toHaveTitle(/\S/);
        const { violations } = await new AxeBuilder({ page }).withTags(rules).analyze();
        expect.soft(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`), `axe on ${name}`).toEqual([]);
        const overhang = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
        expect.soft(overhang, `${name} fits the screen's width`).toBeLessThanOrEqual(0);
      });
    expect([...failures]).toEqual([]);
  });
});

test('the door can be used by anybody @widths', async ({ page }) => {
  await page.goto('/sign-in');
  const { violations } = await new AxeBuilder({ page }).withTags(rules).analyze();
  expect(violations.map(({ id }) => id)).toEqual([]);
});

test('a page of the product is not shown to somebody who has not signed in', async ({ page }) => {
  for (const { name, address, atTheDoor } of await demoPages(personWith('owner').siteId)) {
    if (atTheDoor) continue;
    await page.goto(address);
    await expect(page, name).toHaveURL(/\/sign-in/);
  }
});
