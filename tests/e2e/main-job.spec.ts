import { expect, signIn, sitePage, test } from './setup/people';

test('an owner brings in a menu: a dry run says each bad line, and the mended file is applied whole', async ({ page }) => {
  await signIn(page, 'owner');
  await page.goto(sitePage('owner', 'menu'));
  await page.getByRole('button', { name: 'Bring in a file' }).click();
  const panel = page.getByRole('dialog', { name: 'Bring in a file' });
  const file = (text: string) => ({ name: 'menu.csv', mimeType: 'text/csv', buffer: Buffer.from(text) });
  await panel.getByLabel('Choose the file').setInputFiles(file('Section;Item;Course\nSoups;Leek soup;Starters\nSoups;;Starters\nSoups;Bisque;Elevenses\n'));
  await expect(panel.getByText('2 bad lines')).toBeVisible();
  await expect(panel.getByRole('row', { name: /^3 Item Item is empty/ })).toBeVisible();
  await expect(panel.getByRole('row', { name: /^4 Course/ })).toContainText('Elevenses');
  await expect(panel.getByRole('button', { name: /^Bring in \d/ })).toBeDisabled();
  await panel.getByLabel('Choose the file').setInputFiles(file('Section;Item;Course\nSoups;Leek soup;Starters\nSoups;Bisque;Starters\n'));
  await panel.getByRole('button', { name: 'Bring in 2 items' }).click();
  await expect(panel.getByRole('status')).toContainText('2 items are new');
  await panel.getByRole('button', { name: 'Done' }).click();
  await page.getByRole('navigation', { name: 'Menu sections' }).getByRole('link', { name: /Soups/ }).click();
  await expect(page.getByLabel('Name of Bisque', { exact: true })).toHaveValue('Bisque');
});

test('a chef changes the menu by keys alone: a name, the next line, sold out, and back', async ({ page }) => {
  await signIn(page, 'chef');
  await page.goto(`${sitePage('chef', 'menu')}?section=oysters`);
  const names = page.locator('[data-column="name"]');
  await names.first().focus();
  const before = await names.first().inputValue();
  await page.keyboard.press('Control+A');
  await page.keyboard.type('Rock oysters, half a dozen');
  await page.keyboard.press('Enter');
  await expect(names.nth(1)).toBeFocused();
  await expect(page.getByText('Rock oysters, half a dozen saved.')).toBeVisible();
  await page.reload();
  await expect(names.first()).toHaveValue('Rock oysters, half a dozen');
  await names.first().focus();
  await page.keyboard.type('x');
  await page.keyboard.press('Escape');
  await expect(names.first()).toHaveValue('Rock oysters, half a dozen');
  expect(before).not.toBe('Rock oysters, half a dozen');
  await page.getByLabel('Rock oysters, half a dozen is sold out').press('Space');
  await expect(page.getByText('Rock oysters, half a dozen is sold out.')).toBeVisible();
});

test('an installer is told which name is wrong and mends it with one press', async ({ page }) => {
  await signIn(page, 'installer');
  await page.goto(sitePage('installer', 'printers'));
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('2 to fix, 1 to look at');
  await page.getByRole('button', { name: 'Rename to LARDER1' }).click();
  await expect(page.getByRole('rowheader', { name: 'LARDER1', exact: true })).toBeVisible();
  await page.getByRole('button', { name: 'It goes to 10.20.30.210:9100 now' }).click();
  await expect(page.getByText('goes to a parallel port')).toHaveCount(0);
});

test('an installer who types a short address is told what it would become, before anything is saved', async ({ page }) => {
  await signIn(page, 'installer');
  await page.goto(`${sitePage('installer', 'printers')}?printer=grill1`);
  const panel = page.getByRole('dialog');
  await panel.getByLabel('Address', { exact: true }).fill('10.20.201');
  await expect(panel.getByText(/10\.20\.0\.201/).first()).toBeVisible();
});

test('a trainer tries a ready order, reads why a dish is on two tickets, and keeps the order over a reload', async ({ page }) => {
  await signIn(page, 'trainer');
  await page.goto(sitePage('trainer', 'try'));
  await page.getByRole('combobox', { name: 'Plan' }).selectOption('Dinner as edited, not live yet');
  await page.getByRole('button', { name: /with side salad/ }).click();
  await expect(page.getByText('SIDE SALAD').first()).toBeVisible();
  await page.getByRole('list', { name: 'Lines of the order' }).getByRole('button').first().click();
  await expect(page.getByText(/splits to Larder/).first()).toBeVisible();
  await page.reload();
  await expect(page.getByText('SIDE SALAD').first()).toBeVisible();
});

test('a finding shows its example as an order, and its way on paper', async ({ page }) => {
  await signIn(page, 'chef');
  await page.goto(sitePage('chef', 'board'));
  await page.getByRole('link', { name: 'Show the way it goes' }).click();
  await expect(page.getByText('1 line would print nowhere').first()).toBeVisible();
  await expect(page.getByText(/has no rule that sends it to a station/).first()).toBeVisible();
});

test('an owner closes a gap that the fault drill shows with the press that it offers', async ({ page }) => {
  await signIn(page, 'owner');
  await page.goto(`${sitePage('owner', 'proof')}?plan=dinner`);
  await expect(page.getByText('10 items would print nowhere').first()).toBeVisible();
  const drill = page.getByRole('table', { name: 'Single points of failure' });
  const bar = drill.getByRole('row').filter({ has: page.getByRole('rowheader', { name: 'BAR1 Printer down' }) });
  await expect(bar).toContainText('61 lost');
  await bar.getByRole('button', { name: /back it up$/ }).click();
  await expect(drill.getByRole('rowheader', { name: 'BAR1 Printer down' })).toHaveCount(0);
});

test('each person finds the handful of pages that are theirs', async ({ page }) => {
  await signIn(page, 'installer');
  await page.goto(sitePage('installer', 'board'));
  const pages = page.getByRole('navigation', { name: 'Pages' });
  await expect(pages.getByRole('link', { name: 'Printers' })).toBeVisible();
  await expect(pages.getByRole('link', { name: 'Menu' })).toHaveCount(0);
});

test('a wrong password is refused in words, and signing out ends the session on the server', async ({ page, request }) => {
  await page.goto('/sign-in');
  await signIn(page, 'chef');
  const cookies = await page.context().cookies();
  await page.goto(sitePage('chef', 'board'));
  await page.getByRole('button', { name: /Ines/ }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page.getByRole('status')).toContainText('You are signed out');
  const again = await request.get(sitePage('chef', 'board'), { headers: { cookie: cookies.map(({ name, value }) => `${name}=${value}`).join('; ') }, maxRedirects: 0 });
  expect(again.status()).toBe(307);
  await page.getByLabel('E-mail').fill('nobody@lanternyard.example');
  await page.getByLabel('Password').fill('not the password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert').filter({ hasText: 'do not belong together' })).toBeVisible();
});
