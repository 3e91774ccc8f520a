import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { mkdir, utimes, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';

const PAGE = { kind: 'APP_PAGE' };
let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'pages-'));
  vi.stubEnv('PAGE_CACHE', folder);
  vi.stubEnv('NEXT_DIST_DIR', 'no-such-build');
  vi.stubEnv('BASE_URL', 'https://air.example');
});

afterEach(() => {
  vi.unstubAllEnvs();
  rmSync(folder, { recursive: true, force: true });
});

/** A process of its own: a fresh copy of the module, with a memory of its own, over the same folder. */
async function newProcess() {
  vi.resetModules();
  const { default: SharedCache, expireAll } = await import('@/lib/pages/cache-handler.mjs');
  return { cache: new SharedCache(), expireAll };
}

const pageValue = (text: string, status = 200) => ({
  kind: 'APP_PAGE',
  html: `<html><script>self.__next_f.push([1,"${text}"])</script>${text}</html>`,
  rscData: Buffer.from(text),
  status,
  headers: { 'x-next-cache-tags': '_N_T_/layout,_N_T_/materials/pvc' } as Record<string, string>,
  segmentData: new Map([['/a', Buffer.from('segment')]]),
});

const stored = () => readdirSync(join(folder, 'pages')).length;
const tick = () => new Promise((resolve) => setTimeout(resolve, 5));

/** As Next does it: asked, not there, rendered, stored. */
async function render(cache: Awaited<ReturnType<typeof newProcess>>['cache'], key: string, value = pageValue('text')) {
  expect(await cache.get(key, PAGE)).toBeNull();
  await cache.set(key, value, PAGE);
  return value;
}

describe('two processes that share a folder', () => {
  it('read each other’s pages, bytes and all', async () => {
    const one = await newProcess();
    await render(one.cache, '/a');
    const other = await newProcess();
    const entry = await other.cache.get('/a', PAGE);
    expect(entry.value.html).toContain('text');
    expect(Buffer.isBuffer(entry.value.rscData)).toBe(true);
    expect(entry.value.segmentData.get('/a').toString()).toBe('segment');
  });

  it('both see that everything has expired, whichever of them says so', async () => {
    const one = await newProcess();
    const other = await newProcess();
    await render(one.cache, '/a');
    expect(await other.cache.get('/a', PAGE)).not.toBeNull();
    await tick();
    await other.expireAll();
    expect(await one.cache.get('/a', PAGE)).toBeNull();
    expect(await other.cache.get('/a', PAGE)).toBeNull();
  });

  it('both see that one tag has expired, and keep what does not carry it', async () => {
    const one = await newProcess();
    const other = await newProcess();
    await render(one.cache, '/a');
    await render(one.cache, '/b', { ...pageValue('b'), headers: { 'x-next-cache-tags': '_N_T_/layout' } });
    await tick();
    await one.cache.revalidateTag('_N_T_/materials/pvc');
    expect(await other.cache.get('/a', PAGE)).toBeNull();
    expect(await other.cache.get('/b', PAGE)).not.toBeNull();
  });

  it('do not take a page whose render began before it expired', async () => {
    const one = await newProcess();
    expect(await one.cache.get('/a', PAGE)).toBeNull();
    await tick();
    await one.expireAll();
    await tick();
    await one.cache.set('/a', pageValue('old'), PAGE);
    expect(await one.cache.get('/a', PAGE)).toBeNull();
  });
});

describe('a stored page', () => {
  it('carries its own policy, for the visitor who caused it and for all after', async () => {
    const one = await newProcess();
    const value = await render(one.cache, '/a');
    expect(value.headers['content-security-policy']).toMatch(/script-src https:\/\/air\.example\S* \S+ 'sha256-/);
    const entry = await (await newProcess()).cache.get('/a', PAGE);
    expect(entry.value.headers['content-security-policy']).toBe(value.headers['content-security-policy']);
  });

  it('names the address the site has now, not the one it had when stored', async () => {
    await render((await newProcess()).cache, '/a');
    vi.stubEnv('BASE_URL', 'https://moved.example');
    const entry = await (await newProcess()).cache.get('/a', PAGE);
    expect(entry.value.headers['content-security-policy']).toContain('https://moved.example/_next/static/');
  });

  it('is not kept when a visitor’s own header put a nonce into it', async () => {
    const { cache } = await newProcess();
    await render(cache, '/a', { ...pageValue('a'), html: '<script nonce="attacker">1</script>' });
    expect(await cache.get('/a', PAGE)).toBeNull();
  });

  it('tells caches in between to ask again', async () => {
    const value = await render((await newProcess()).cache, '/a');
    expect(value.headers['cache-control']).toBe('public, max-age=0, must-revalidate');
  });
});

describe('an address that leads nowhere', () => {
  it('is kept in memory and never on disk', async () => {
    const { cache } = await newProcess();
    await render(cache, '/a');
    await render(cache, '/made-up', pageValue('nothing', 404));
    expect(stored()).toBe(1);
    expect((await cache.get('/made-up', PAGE)).value.status).toBe(404);
  });

  it('is forgotten when many more are made up', async () => {
    const { cache } = await newProcess();
    await render(cache, '/made-up', pageValue('nothing', 404));
    for (let i = 0; i < 200; i += 1) await cache.set(`/other-${i}`, pageValue('nothing', 404), PAGE);
    expect(await cache.get('/made-up', PAGE)).toBeNull();
  });

  it('shows the words the build made for it, also without scripts', async () => {
    const build = join(folder, 'build');
    await mkdir(join(build, 'server/app'), { recursive: true });
    await writeFile(join(build, 'server/app/_not-found.html'), '<h1>Nothing at this address</h1>');
    vi.spyOn(process, 'cwd').mockReturnValue(folder);
    vi.stubEnv('NEXT_DIST_DIR', 'build');
    const { cache } = await newProcess();
    const value = await render(cache, '/made-up', pageValue('', 404));
    expect(value.html).toBe('<h1>Nothing at this address</h1>');
  });

  it('gives way once a page is there', async () => {
    const { cache, expireAll } = await newProcess();
    await render(cache, '/new', pageValue('nothing', 404));
    await tick();
    await expireAll();
    await tick();
    await render(cache, '/new', pageValue('now there'));
    expect((await cache.get('/new', PAGE)).value.html).toContain('now there');
  });
});

describe('the folder', () => {
  it('is swept of its oldest pages when there are too many', async () => {
    const { sweep } = await import('@/lib/pages/folder.mjs');
    await mkdir(join(folder, 'pages'));
    for (let i = 0; i < 21; i += 1) {
      await writeFile(join(folder, 'pages', `page-${i}`), '');
      await utimes(join(folder, 'pages', `page-${i}`), 1000 + i, 1000 + i);
    }
    await sweep(20);
    expect(stored()).toBe(18);
    expect(readdirSync(join(folder, 'pages'))).not.toContain('page-0');
    expect(readdirSync(join(folder, 'pages'))).toContain('page-20');
  });

  it('does not hand one build’s pages to the next', async () => {
    vi.spyOn(process, 'cwd').mockReturnValue(folder);
    vi.stubEnv('NEXT_DIST_DIR', 'build');
    await mkdir(join(folder, 'build'));
    await writeFile(join(folder, 'build/BUILD_ID'), 'first');
    await render((await newProcess()).cache, '/a');
    expect(await (await newProcess()).cache.get('/a', PAGE)).not.toBeNull();
    await writeFile(join(folder, 'build/BUILD_ID'), 'second');
    expect(await (await newProcess()).cache.get('/a', PAGE)).toBeNull();
  });

  it('is read past a file that is broken', async () => {
    const { cache } = await newProcess();
    await render(cache, '/a');
    for (const name of readdirSync(join(folder, 'pages'))) await writeFile(join(folder, 'pages', name), 'broken');
    expect(await (await newProcess()).cache.get('/a', PAGE)).toBeNull();
  });
});
