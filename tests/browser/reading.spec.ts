import { expect, test } from '@playwright/test';

test.describe('reading without scripts', () => {
  test.use({ javaScriptEnabled: false });

  test('an entry shows its control, reason, plate, sources and caution', async ({ page }) => {
    await page.goto('/materials/pvc');
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('PVC, rigid');
    const row = page.locator('#pair-laser-cutting');
    await expect(row.getByText('Prohibited')).toBeVisible();
    await expect(row.getByText(/hydrogen chloride/i).first()).toBeVisible();
    await expect(page.getByRole('region', { name: 'Data plate' }).getByText('9002-86-2')).toBeVisible();
    await expect(page.locator('#source-1')).toBeVisible();
    await expect(page.getByText('the local emergency number', { exact: false }).first()).toBeVisible();
  });

  test('units switch by the buttons alone', async ({ page }) => {
    await page.goto('/processes/soldering');
    const plate = page.getByRole('region', { name: 'Data plate' });
    await expect(plate.locator('.si').first()).toBeVisible();
    await expect(plate.locator('.us').first()).toBeHidden();
    await page.getByRole('radio', { name: 'US customary units' }).check();
    await expect(plate.locator('.us').first()).toBeVisible();
    await expect(plate.locator('.si').first()).toBeHidden();
  });

  test('the library narrows by facets and turns pages', async ({ page }) => {
    await page.goto('/library');
    await page.getByRole('link', { name: /^Materials/ }).click();
    await page.getByRole('link', { name: /^Prohibited/ }).click();
    await expect(page).toHaveURL(/kind=material&control=prohibited/);
    await expect(
      page
        .getByRole('link', { name: 'PTFE', exact: true })
        .or(page.getByRole('link', { name: 'Next' }))
        .first(),
    ).toBeVisible();
    await page.goto('/library');
    await page.getByRole('link', { name: 'Next' }).click();
    await expect(page).toHaveURL(/page=2/);
  });

  test('a search and a check answer from a plain form', async ({ page }) => {
    await page.goto('/search?q=lasercut+pvc');
    await expect(
      page.getByRole('region', { name: /PVC, rigid: Laser cutting/ }).getByText('Prohibited', { exact: true }),
    ).toBeVisible();
    await page.goto('/check');
    await page.getByLabel('What is it made of?').fill('acetal');
    await page.getByLabel('What will you do with it?').fill('laser cutter');
    await page.getByRole('button', { name: 'Check' }).click();
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Acetal: laser cutting');
    await expect(page.getByText('Enclosed exhaust').first()).toBeVisible();
  });

  test('a wrong address says so and offers the search', async ({ page }) => {
    const response = await page.goto('/materials/no-such-thing');
    expect(response!.status()).toBe(404);
    await expect(page.locator('form[action="/search"]').first()).toBeVisible();
  });
});

test('the pairs of a material sort, filter and can be linked to', async ({ page }) => {
  await page.goto('/materials/pvc#pair-solvent-cementing');
  await expect(page.locator('#pair-solvent-cementing')).toBeInViewport();
  const names = () => page.locator('tr[id^=pair-] th a:first-child').allTextContents();
  await page.getByRole('button', { name: /^Process/ }).click();
  const sorted = await names();
  expect(sorted).toEqual([...sorted].sort((a, b) => a.localeCompare(b)));
  await page.getByLabel('Show').selectOption('prohibited');
  expect((await names()).length).toBeLessThan(sorted.length);
  await expect(page.locator('#pair-laser-cutting')).toBeVisible();
});

test('the chosen units are remembered on the next page, and stored numbers do not change', async ({ page }) => {
  await page.goto('/processes/soldering');
  await page.getByRole('radio', { name: 'US customary units' }).check();
  await page.goto('/processes/welding');
  await expect(page.locator('html')).toHaveAttribute('data-units', 'us');
  await expect(page.getByRole('region', { name: 'Data plate' }).locator('.us').first()).toContainText('fpm');
  const answer = await page.request.get('/api/entries/process/welding');
  expect((await answer.json()).frontMatter.capture.velocity.unit).toBe('m/s');
});

test('an airflow on an entry opens its working with the same numbers', async ({ page }) => {
  await page.goto('/processes/soldering');
  const plate = page.getByRole('region', { name: 'Data plate' });
  await plate.getByRole('link', { name: /working/ }).click();
  await expect(page).toHaveURL(/\/worksheets\/hood-airflow\?.*hood=flanged-opening/);
  await expect(page.getByRole('region', { name: 'Answer' })).toContainText(/\d+\s?m³\/h/);
  await expect(page.getByLabel('Distance', { exact: false }).first()).not.toHaveValue('');
});

test('a wrong address searches for its own words', async ({ page }) => {
  await page.goto('/materials/polycarbonat');
  await expect(page.getByRole('link', { name: 'Polycarbonate' }).first()).toBeVisible();
});

test('the print sheet leaves out the bar and names the revision', async ({ page }) => {
  await page.goto('/materials/acetal');
  await page.emulateMedia({ media: 'print' });
  await expect(page.getByRole('navigation').first()).toBeHidden();
  await expect(page.getByText(/revision \d+ · \d{4}-\d\d-\d\d/)).toBeVisible();
});
