import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';

const PAGES = [
  '/',
  '/library',
  '/library?kind=material&control=prohibited',
  '/library/sources',
  '/materials/pvc',
  '/processes/laser-cutting',
  '/substances/formaldehyde',
  '/guides/make-up-air-and-flues',
  '/check',
  '/check?material=acrylic&process=laser-cutting',
  '/check?material=unheard-of&process=laser-cutting',
  '/search?q=pvc%20laser',
  '/search?q=zzzzqqqq',
  '/worksheets',
  '/worksheets/hood-airflow',
  '/worksheets/hood-airflow?hood=flanged-opening&velocity=0.5&distance=0.3&diameter=0.2',
  '/worksheets/duct-pressure?airflow=500&hood.entryLossFactor=0.5&runs.0.duct=flexible-slack&runs.0.diameter=125&runs.0.length=8',
  '/worksheets/room-balance?room.volume=62&air.indoor=20&air.outdoor=2&exhausts.0.name=laser&exhausts.0.airflow=576&makeUp.leakage.ach50=6&appliances.0.name=heater&appliances.0.vent=natural-draught',
  '/worksheets/clearing-time?volume=52&airflow=1000&removal=0.99',
  '/worksheets/release?material=pvc&massLost=2&room.volume=60',
  '/workshops',
  '/about',
  '/materials/no-such-thing',
];

for (const colorScheme of ['light', 'dark'] as const)
  for (const width of [1280, 390])
    test.describe(`${colorScheme} at ${width}`, () => {
      test.use({ colorScheme, viewport: { width, height: 900 } });
      for (const path of PAGES)
        test(`axe finds nothing on ${path}`, async ({ page }) => {
          await page.goto(path, { waitUntil: 'networkidle' });
          const { violations } = await new AxeBuilder({ page })
            .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
            .analyze();
          expect(
            violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`),
          ).toEqual([]);
          expect(
            await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth),
          ).toBeLessThanOrEqual(0);
        });
    });

test('nothing scrolls sideways at 320 px', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 800 });
  for (const path of PAGES) {
    await page.goto(path);
    expect(await page.evaluate(() => document.documentElement.scrollWidth), path).toBeLessThanOrEqual(320);
  }
});
