import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it, vi } from 'vitest';
import WorksheetPage, { generateMetadata } from '@/app/worksheets/[name]/page';
import { asks } from '@/components/worksheets/asked/live-results';
import { exampleAddress } from '@/lib/worksheets/ask/ask-page';
import { inUnits, typedOf } from '@/lib/worksheets/ask/request';
import { paramsOf } from '@/lib/worksheets/ask/typed';
import { EXAMPLES } from '@/lib/worksheets/examples';
import { worksheetNamed } from '@/lib/worksheets/list';
import { libraryFacts } from '../lib/worksheets/library-facts';

/** The library is the starter one, from its files: no page here is about how it is stored. */
vi.mock('@/lib/search/facts-for', () => ({ factsFor: async () => libraryFacts }));

/** The page as it comes without scripts. */
async function pageAt(name: string, query: string): Promise<string> {
  const searchParams: Record<string, string | string[]> = {};
  const address = new URLSearchParams(query);
  for (const key of address.keys()) {
    const all = address.getAll(key);
    searchParams[key] = all.length > 1 ? all : all[0]!;
  }
  const page = await WorksheetPage({
    params: Promise.resolve({ name }),
    searchParams: Promise.resolve(searchParams),
  });
  return renderToStaticMarkup(page).replaceAll('&amp;', '&');
}

const NAMES = Object.keys(asks) as (keyof typeof asks)[];
const example = (name: keyof typeof asks) => exampleAddress(asks[name], EXAMPLES[name]!).split('?')[1]!;
const DUCT = 'airflow=500&hood.entryLossFactor=0.5&runs.0.duct=galvanised-steel&runs.0.diameter=125&runs.0.length=8';
const DILUTION = 'generation.massRate=20&limit.value=40&limit.unit=mg/m3&mixingFactor=5';

describe.each(NAMES)('the page of %s without scripts', (name) => {
  it('answers its example, marked as invented, with working, table and caution, and nothing that is no number', async () => {
    const html = await pageAt(name, example(name));
    expect(html).toContain('Invented example');
    expect(html).toMatch(/data-result="\w+"/);
    expect(html).toContain('The working, with the source of each equation');
    expect(html).toContain(`href="/api/worksheets/${name}/table.csv?`);
    expect(html).toContain('a licensed practitioner decide');
    expect(html).not.toMatch(/NaN|Infinity|undefined|\[object/);
    expect(html).not.toMatch(/\sstyle=/);
    expect(html).not.toMatch(/\bsafe(ty|ly)?\b/i);
  });

  it('marks the example in the other units too, and no question of a reader’s own', async () => {
    const us = paramsOf(inUnits(asks[name], typedOf(asks[name], EXAMPLES[name]!), 'us')).toString();
    expect(await pageAt(name, us)).toContain('Invented example');
    expect(await pageAt(name, `${example(name)}&circumstances=combustible`)).not.toContain('Invented example');
  });

  it('leads with each caution of what is ticked, answered or not', async () => {
    for (const rest of [`${example(name)}&`, '']) {
      const html = await pageAt(name, `${rest}circumstances=carbon-monoxide&circumstances=combustible`);
      const [first, second] = ['carbon-monoxide', 'combustible'].map((code) => html.indexOf(`data-code="${code}"`));
      expect(first).toBeGreaterThan(0);
      expect(second).toBeGreaterThan(first!);
      if (html.includes('data-result')) expect(second).toBeLessThan(html.indexOf('data-result'));
    }
  });

  it('leads from every fault of half a question to a field that is there, in a whole sentence', async () => {
    const all = [...new URLSearchParams(example(name))];
    let told = 0;
    for (const half of [...all.map((each) => [each]), ...all.map((_, i) => all.filter((__, j) => j !== i))]) {
      const html = await pageAt(name, new URLSearchParams(half).toString());
      const list = /<div role="alert".*?<\/ul>/s.exec(html)?.[0] ?? '';
      for (const [, id, sentence] of list.matchAll(/<li><a href="#([^"]+)">([^<]+)<\/a>/g)) {
        expect(html, sentence).toContain(`id="${id}"`);
        expect(sentence).toMatch(/^[A-Z].*\.$/);
        told += 1;
      }
      expect(list).not.toMatch(/<li>[^<]/);
    }
    expect(told).toBeGreaterThan(all.length / 2);
  });

  it('asks nothing at first, and tolerates any address', async () => {
    expect(await pageAt(name, '')).toContain('Nothing asked yet');
    for (const query of ['airflow=%00%F0%9F', 'circumstances=xx&units=xx', 'add=xx', 'remove=runs.99', 'runs.x.y=1'])
      expect(await pageAt(name, query)).not.toContain('data-result');
  });

  it('is titled by its question', async () => {
    const metadata = await generateMetadata({ params: Promise.resolve({ name }), searchParams: Promise.resolve({}) });
    expect(metadata).toMatchObject({
      title: worksheetNamed(name)!.title,
      alternates: { canonical: `/worksheets/${name}` },
    });
  });
});

describe('a worksheet page', () => {
  it('answers by the sum that is done by hand', async () => {
    // 20 mg/s over 40 mg/m3, five times: 2.5 m3/s = 9000 m3/h = 5297 cfm.
    expect(await pageAt('dilution', DILUTION)).toMatch(/data-result="airflow">9000<span[^>]*>\u2009m³\/h/);
    expect(await pageAt('dilution', `${DILUTION}&units=us`)).toMatch(/data-result="airflow">5300<span[^>]*>\u2009cfm/);
  });

  it('links the same question in the other units', async () => {
    const html = await pageAt('duct-pressure', DUCT);
    const us = /href="\/worksheets\/duct-pressure\?([^"]+units=us)"/.exec(html)![1]!;
    const pascals = (text: string) => /data-result="staticPressure">([\d.]+)/.exec(text)![1]!;
    expect(Number(pascals(await pageAt('duct-pressure', us))) * 249.0889).toBeCloseTo(Number(pascals(html)), -1);
  });

  it('grows and loses a row by its buttons and keeps what was typed', async () => {
    const more = await pageAt('duct-pressure', `${DUCT}&add=runs`);
    expect(more).toContain('name="runs.1.diameter"');
    expect(more).toContain('value="125"');
    expect(more).not.toContain('role="alert"');
    const nested = await pageAt('duct-pressure', `${DUCT}&runs.1.diameter=&add=runs.1.fittings`);
    expect(nested).toContain('name="runs.1.fittings.0.count"');
    const less = await pageAt('duct-pressure', `${DUCT}&runs.1.diameter=99&remove=runs.0`);
    expect(less).toContain('value="99"');
    expect(less).not.toContain('value="125"');
  });

  it('says on paper what was asked', async () => {
    const html = await pageAt('duct-pressure', DUCT);
    const plate = /<dl class="print-only">.*?<\/dl>/s.exec(html)![0];
    expect(plate).toMatch(/run 1: diameter inside<\/dt><dd[^>]*>125\u00a0mm/);
    expect(plate).toMatch(/run 1: kind of duct<\/dt><dd[^>]*>galvanised steel/);
  });

  it('puts a hostile text into the page as text', async () => {
    const html = await pageAt('dilution', `limit.value=${encodeURIComponent('"><script>x</script>')}`);
    expect(html).not.toContain('<script>');
    expect(html).toContain('&quot;&gt;&lt;script&gt;');
  });

  it('is none for a name that is no worksheet, or one with a page of its own', async () => {
    for (const name of ['nothing', 'constructor', '__proto__', 'hood-airflow'])
      await expect(pageAt(name, '')).rejects.toThrow(/NEXT_HTTP_ERROR_FALLBACK;404/);
    const params = Promise.resolve({ name: 'nothing' });
    expect(await generateMetadata({ params, searchParams: Promise.resolve({}) })).toEqual({});
  });
});
