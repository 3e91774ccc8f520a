import { expect, test, type Page } from '@playwright/test';

const loaded = async (page: Page) => {
  await page.goto('/workshops');
  await page.getByRole('button', { name: 'Load an invented workshop' }).click();
  await expect(page.getByRole('region', { name: 'Stations and materials' })).toBeVisible();
};

test('a visitor builds a workshop on a phone, asks about a pair, sees why it falls short and what would mend it', async ({
  page,
}) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await page.goto('/workshops');
  await page.getByLabel('Name of the workshop').fill('Garden shed');
  await page.getByRole('button', { name: 'Next' }).click();
  const room = page.getByRole('group', { name: 'Room 1' });
  await room.getByLabel('Name', { exact: true }).fill('shed');
  await room.getByLabel('Volume (m³)').fill('40');
  await page.getByRole('button', { name: 'Next' }).click();
  const exhaust = page.getByRole('group', { name: 'Exhaust 1' });
  await exhaust.getByLabel('Name', { exact: true }).fill('bench fan');
  await exhaust.getByLabel('Room').selectOption('shed');
  await exhaust.getByLabel('Its airflow, if no curve is at hand (m³/h)').fill('120');
  await page.getByRole('button', { name: 'Next' }).click();
  const station = page.getByRole('group', { name: 'Station 1' });
  await station.getByLabel('Machine or bench').fill('bench');
  await station.getByLabel('Exhaust it is at').selectOption('bench fan');
  await station.getByLabel('What is done there').selectOption('soldering');
  await station.getByLabel('Its hood').selectOption('plain-opening');
  await station.getByLabel('Distance of the work from the hood (mm)').fill('200');
  await station.getByLabel('Diameter of a round hood (mm)').fill('100');
  expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0);

  await page.goto('/check?material=lead-free-solder&process=soldering');
  const cope = page.getByRole('region', { name: 'Does mine cope?' });
  await expect(cope).toContainText('Falls short by');
  await expect(cope).toContainText('What limits it most: hood too far away');
  await expect(cope.getByRole('listitem').first()).toContainText('Bring the hood to half the distance');
});

test('a prohibited pair stays prohibited in the table, and each cell opens to its reasons', async ({ page }) => {
  await loaded(page);
  const row = page.getByRole('row', { name: /laser cutter/ });
  await row.getByRole('button', { name: 'Prohibited' }).click();
  await expect(page.getByText('No airflow makes a prohibited pair acceptable.')).toBeVisible();
  await row.getByRole('button', { name: 'Falls short' }).first().click();
  const opened = page.locator('[data-verdict="falls short"]');
  await expect(opened).toContainText('the flue of the water heater is beaten');
  await expect(opened).toContainText('What would change it most');
});

test('what is typed is kept as it stands, and a second tab does not overwrite it unseen', async ({ page, context }) => {
  await loaded(page);
  const other = await context.newPage();
  await other.goto('/workshops');
  await other.getByLabel('Name of the workshop').fill('The other tab');
  await page.getByLabel('Name of the workshop').fill('This tab');
  await expect(page.getByRole('alert').first()).toContainText('Another tab has saved this workshop');
  await expect(page.getByLabel('Name of the workshop')).toHaveValue('This tab');
  await page.getByRole('button', { name: 'keep this one' }).click();
  await page.reload();
  await expect(page.getByLabel('Name of the workshop')).toHaveValue('This tab');
});

test('readings are held against their baseline', async ({ page }) => {
  await loaded(page);
  await expect(page.getByRole('region', { name: 'Readings against their baseline' })).toContainText(
    'Out of use until it is mended',
  );
});

test('prints a sheet for the wall without the form', async ({ page }) => {
  await loaded(page);
  await page.emulateMedia({ media: 'print' });
  await expect(page.getByRole('region', { name: 'Stations and materials' })).toBeVisible();
  await expect(page.getByLabel('Name of the workshop')).toBeHidden();
});
