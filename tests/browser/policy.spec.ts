import { expect, test } from '@playwright/test';

const STORED = [
  '/',
  '/about',
  '/library/sources',
  '/worksheets',
  '/materials/pvc',
  '/processes/welding',
  '/substances/benzene',
  '/guides/filters',
  '/materials/no-such-thing',
  '/no/such/page',
];
const ASKED = [
  '/library',
  '/search?q=pvc',
  '/check?material=pvc&process=laser-cutting',
  '/worksheets/hood-airflow',
  '/worksheets/fan-duty',
  '/workshops',
];

for (const path of [...STORED, ...ASKED])
  test(`${path} carries a policy that names every script it runs, and runs them`, async ({ page }) => {
    const refused: string[] = [];
    page.on('console', (message) => {
      if (/content security policy|refused to/i.test(message.text())) refused.push(message.text());
    });
    const response = await page.goto(path, { waitUntil: 'networkidle' });
    const policy = (await response!.headersArray())
      .filter(({ name }) => name.toLowerCase() === 'content-security-policy')
      .map(({ value }) => value)
      .join('; ');
    expect(policy).toMatch(/script-src /);
    expect(policy).not.toMatch(/script-src[^;]*('unsafe-inline'|'unsafe-eval'|\*)/);
    expect(policy).toMatch(/object-src 'none'/);
    expect(policy).toMatch(/base-uri 'none'/);
    expect(policy).toMatch(/frame-ancestors 'none'/);
    expect(policy.includes("'nonce-")).toBe(ASKED.includes(path));
    expect(refused).toEqual([]);
    await page.getByRole('radio', { name: 'US customary units' }).check();
    await expect(page.locator('html')).toHaveAttribute('data-units', 'us');
  });

for (const path of ['/materials/acetal', '/search?q=pvc'])
  test(`a script planted in ${path} does not run`, async ({ page }) => {
    await page.route(`**${path}`, async (route) => {
      const response = await route.fetch();
      const planted =
        '<script>window.planted = 1</script><img src=x onerror="window.planted = 2"><script src="/planted.js"></script>';
      await route.fulfill({ response, body: (await response.text()).replace('</main>', `${planted}</main>`) });
    });
    await page.route('**/planted.js', (route) =>
      route.fulfill({ contentType: 'text/javascript', body: 'window.planted = 3' }),
    );
    await page.goto(path, { waitUntil: 'networkidle' });
    expect(await page.evaluate(() => 'planted' in window)).toBe(false);
  });

test('what a reader types comes back as text everywhere', async ({ page }) => {
  const typed = '"><svg onload=window.planted=1><script>window.planted=1</script>';
  for (const path of [
    `/search?q=${encodeURIComponent(typed)}`,
    `/check?material=${encodeURIComponent(typed)}&process=${encodeURIComponent(typed)}`,
    `/materials/${encodeURIComponent(typed)}`,
  ]) {
    await page.goto(path, { waitUntil: 'networkidle' });
    expect(await page.evaluate(() => 'planted' in window), path).toBe(false);
  }
});

test('every answer of the API forbids being run, framed or sniffed', async ({ request }) => {
  for (const path of [
    '/api/search?q=pvc',
    '/api/check?material=pvc&process=laser-cutting',
    '/api/health/live',
    '/api/openapi.json',
    '/api/entries',
    '/api/entries/material/none',
  ]) {
    const headers = (await request.get(path)).headers();
    expect(headers['x-content-type-options'], path).toBe('nosniff');
    expect(headers['content-security-policy'], path).toContain("default-src 'none'");
  }
});
