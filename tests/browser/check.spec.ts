import { expect, test } from '@playwright/test';

test('a laminate is checked by both its materials, and the address can be sent to somebody', async ({
  page,
  context,
}) => {
  await page.goto('/check');
  await page.getByLabel('What is it made of?').fill('plywood');
  await page
    .getByRole('option', { name: /^Plywood/ })
    .first()
    .click();
  await page.getByRole('button', { name: 'Add a layer' }).click();
  await page.getByLabel('And layer 2?').fill('PVC, rigid');
  const process = page.getByLabel('What will you do with it?');
  await process.fill('laser cut');
  await page.getByRole('option', { name: /^Laser cutting/ }).click();
  await page.getByRole('button', { name: 'Check' }).click();
  await expect(page.locator('main').getByText('Prohibited', { exact: true }).first()).toBeVisible();
  await expect(page.getByRole('region', { name: 'Why' }).getByRole('listitem')).toHaveCount(2);
  const other = await context.newPage();
  await other.goto(page.url());
  await expect(other.getByRole('heading', { level: 1 })).toHaveText(
    await page.getByRole('heading', { level: 1 }).innerText(),
  );
});

test('what is not in the library is not identified, and nothing typed is lost', async ({ page }) => {
  await page.goto('/check?material=Mystery%20sheet&process=laser%20cutting');
  await expect(page.getByText('Not identified: do not run it').first()).toBeVisible();
  await expect(page.getByText('Treat it as prohibited until it is identified').first()).toBeVisible();
  await expect(page.getByLabel('What is it made of?')).toHaveValue('Mystery sheet');
});

test('a missing answer is asked for beside its field', async ({ page }) => {
  await page.goto('/check?material=pvc');
  await expect(page.getByLabel('What will you do with it?')).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByText('Name a process.')).toBeVisible();
  await expect(page.getByLabel('What is it made of?')).toHaveValue('pvc');
});

test('nothing on a prohibited answer offers an airflow, and all of them close with the caution', async ({ page }) => {
  await page.goto('/check?material=pvc&process=laser-cutting');
  await expect(page.getByRole('region', { name: 'Capture and airflow' })).toContainText(
    'no airflow makes a prohibited pair acceptable',
  );
  await expect(page.getByRole('complementary', { name: 'Caution' })).toContainText('local emergency number');
});
