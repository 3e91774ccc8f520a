import { expect, test } from '@playwright/test';

test('the field in the bar suggests, from the keyboard, and Enter goes to the results', async ({ page }) => {
  await page.goto('/');
  await page.locator('body').press('/');
  const field = page.getByRole('banner').getByRole('combobox');
  await expect(field).toBeFocused();
  await field.pressSequentially('formaldehyd');
  const options = page.getByRole('option');
  await expect(options.first()).toBeVisible();
  await field.press('ArrowDown');
  await expect(options.first()).toHaveAttribute('aria-selected', 'true');
  await field.press('Escape');
  await expect(options.first()).toBeHidden();
  await field.press('Enter');
  await expect(page).toHaveURL(/\/search\?q=formaldehyd/);
  await expect(page.getByRole('link', { name: 'Formaldehyde', exact: true }).first()).toBeVisible();
});

test('choosing a suggestion leads to its page', async ({ page }) => {
  await page.goto('/about');
  const field = page.getByRole('banner').getByRole('combobox');
  await field.fill('acetal');
  await page
    .getByRole('option', { name: /^Acetal/ })
    .first()
    .click();
  await expect(page).toHaveURL(/\/materials\/acetal$/);
});

for (const [question, first] of [
  ['50-00-0', 'Formaldehyde'],
  ['CAS 630-08-0', 'Carbon monoxide'],
  ['polycarbonte', 'Polycarbonate'],
  ['does polycarbonate give chlorine', 'Polycarbonate'],
] as const)
  test(`“${question}” finds ${first} first`, async ({ page }) => {
    await page.goto(`/search?q=${encodeURIComponent(question)}`);
    await expect(page.locator('main h2 a, main h3 a').first()).toHaveText(first);
  });

test('a question with a wrong premise lands on the correcting note', async ({ page }) => {
  await page.goto('/search?q=polycarbonate%20gives%20off%20chlorine%20when%20laser%20cut');
  await expect(page.getByText('Often said, and wrong', { exact: false }).first()).toBeVisible();
});

test('a question that finds nothing says what to do next', async ({ page }) => {
  await page.goto('/search?q=zzzzqqqq');
  await expect(page.getByRole('link', { name: /find out what it is/ }).first()).toBeVisible();
});
