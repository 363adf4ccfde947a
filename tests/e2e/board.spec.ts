import { expect, sitePage, test, type Page } from './setup/people';

const rail = (page: Page, station: string) => page.getByRole('region', { name: station, exact: true }).getByRole('list');
const tray = (page: Page) => page.getByRole('region', { name: 'Prints nowhere yet' });
const verdict = (page: Page) => page.getByRole('region', { name: 'Check of this plan' }).getByRole('heading', { level: 2 });

const openBoard = async (page: Page): Promise<void> => {
  await page.goto(sitePage('chef', 'board'));
  await expect(verdict(page)).toHaveText('10 items would print nowhere');
};

/** The next change that the server has taken: a test that ends before would change the demo of the one after it. */
const saved = (page: Page) => page.waitForResponse((response) => response.request().method() === 'PUT' && response.ok());

const sendTo = async (page: Page, section: string, station: string): Promise<void> => {
  await page.getByRole('button', { name: `Send to: ${section}` }).click();
  await page.getByRole('dialog', { name: `Send ${section} to` }).getByRole('button', { name: station, exact: true }).click();
};

test.describe('a chef at the board', () => {
  test.use({ role: 'chef' });

  test('sends what prints nowhere to a station from the list, is told that everything prints, and can take it back', async ({ page }) => {
    await openBoard(page);
    await sendTo(page, 'Oysters', 'Larder');
    await expect(verdict(page)).toHaveText('6 items would print nowhere');
    await sendTo(page, 'Late menu', 'Larder');
    await expect(verdict(page)).not.toContainText('nowhere');
    await expect(rail(page, 'Larder')).toContainText('Oysters');
    await page.reload();
    await expect(rail(page, 'Larder')).toContainText('Late menu');
    await sendTo(page, 'Late menu', 'Sauce');
    await expect(rail(page, 'Sauce')).toContainText('Late menu');
    const save = saved(page);
    await page.getByRole('button', { name: 'Undo', exact: true }).first().click();
    await expect(rail(page, 'Larder')).toContainText('Late menu');
    await save;
  });

  test('mends the loss with the one press that the finding offers', async ({ page }) => {
    await openBoard(page);
    const save = saved(page);
    await page.getByRole('article').filter({ hasText: 'have no station' }).getByRole('button', { name: /^Send to/ }).click();
    await expect(verdict(page)).not.toContainText('nowhere');
    await save;
  });

  test('drags a section to a rail with the mouse', async ({ page }) => {
    await openBoard(page);
    const card = tray(page).getByRole('button', { name: 'Oysters 4 items' });
    const save = saved(page);
    /** The drag code arrives after the first paint; a hand that was too quick tries again. */
    await expect(async () => {
      const from = (await card.boundingBox())!;
      const to = (await page.getByRole('region', { name: 'Larder', exact: true }).boundingBox())!;
      await page.mouse.move(from.x + 40, from.y + 20);
      await page.mouse.down();
      for (let step = 1; step <= 12; step += 1) await page.mouse.move(from.x + 40 + ((to.x + 500 - from.x - 40) * step) / 12, from.y + 20 + ((to.y + 50 - from.y - 20) * step) / 12);
      await page.mouse.up();
      await expect(rail(page, 'Larder')).toContainText('Oysters', { timeout: 2_000 });
    }).toPass();
    await save;
  });

  test('moves a section with the keyboard alone, and hears each step', async ({ page }) => {
    await openBoard(page);
    const card = tray(page).getByRole('button', { name: 'Oysters 4 items' });
    await card.focus();
    await page.keyboard.press('Space');
    await expect(page.getByRole('status').filter({ hasText: 'Oysters' })).toContainText(/lifted/i);
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('ArrowDown');
    await expect(page.getByRole('status').filter({ hasText: 'Larder' })).toBeVisible();
    const save = saved(page);
    await page.keyboard.press('Space');
    await expect(rail(page, 'Larder')).toContainText('Oysters');
    await save;
  });

  test('puts a lifted section back with Escape, and nothing is saved', async ({ page }) => {
    await openBoard(page);
    const card = tray(page).getByRole('button', { name: 'Oysters 4 items' });
    await card.focus();
    await page.keyboard.press('Space');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Escape');
    await expect(tray(page)).toContainText('Oysters');
    await page.reload();
    await expect(tray(page)).toContainText('Oysters');
  });

  test('moves a section with a finger: press and hold, carry, let go @touch', async ({ page }) => {
    await openBoard(page);
    const card = tray(page).getByRole('button', { name: 'Oysters 4 items' });
    const save = saved(page);
    const finger = await page.context().newCDPSession(page);
    const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', x?: number, y?: number) =>
      finger.send('Input.dispatchTouchEvent', { type, touchPoints: x === undefined || y === undefined ? [] : [{ x, y }] });
    await expect(async () => {
      const from = (await card.boundingBox())!;
      const to = (await page.getByRole('region', { name: 'Larder', exact: true }).boundingBox())!;
      const start = { x: from.x + 40, y: from.y + 20 };
      const end = { x: to.x + 400, y: to.y + 50 };
      await touch('touchStart', start.x, start.y);
      await page.waitForTimeout(450);
      for (let step = 1; step <= 12; step += 1) await touch('touchMove', start.x + ((end.x - start.x) * step) / 12, start.y + ((end.y - start.y) * step) / 12);
      await touch('touchEnd');
      await expect(rail(page, 'Larder')).toContainText('Oysters', { timeout: 2_000 });
    }).toPass();
    await save;
  });

  test('is told when somebody else changed the plan first, and does their own again on the newest', async ({ page, browser }) => {
    await openBoard(page);
    const other = await browser.newContext({ storageState: await page.context().storageState() });
    const second = await other.newPage();
    await openBoard(second);
    await sendTo(second, 'Late menu', 'Grill');
    await expect(rail(second, 'Grill')).toContainText('Late menu');
    await sendTo(page, 'Oysters', 'Larder');
    const refusal = page.getByRole('alertdialog', { name: 'Changed by somebody else' });
    const save = saved(page);
    await refusal.getByRole('button', { name: /again on the newest/ }).click();
    await save;
    await expect(rail(page, 'Larder')).toContainText('Oysters');
    await expect(rail(page, 'Grill')).toContainText('Late menu');
    await other.close();
  });

  test('loses nothing when the network goes: it is said, kept and saved later', async ({ page, context }) => {
    await openBoard(page);
    await page.getByRole('button', { name: 'Send to: Oysters' }).click();
    await page.getByRole('dialog', { name: 'Send Oysters to' }).press('Escape');
    await context.setOffline(true);
    await sendTo(page, 'Oysters', 'Larder');
    await expect(rail(page, 'Larder')).toContainText('Oysters');
    await expect(page.getByText(/connection|reached/i).first()).toBeVisible();
    await context.setOffline(false);
    await expect(page.getByText(/connection|cannot be reached/i)).toHaveCount(0, { timeout: 40_000 });
    await page.reload();
    await expect(rail(page, 'Larder')).toContainText('Oysters');
  });
});

test.describe('a trainer at the board', () => {
  test.use({ role: 'trainer' });

  test('reads it and finds nothing to move', async ({ page }) => {
    await page.goto(sitePage('trainer', 'board'));
    await expect(verdict(page)).toHaveText('10 items would print nowhere');
    await expect(page.getByRole('button', { name: /^Send to/ })).toHaveCount(0);
  });
});
