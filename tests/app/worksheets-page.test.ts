import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import HoodAirflowPage from '@/app/worksheets/hood-airflow/page';
import WorksheetsPage from '@/app/worksheets/page';
import { HOODS, type HoodName } from '@/lib/air/hood-airflow';

/** The page as it comes without scripts. */
async function pageAt(query: string): Promise<string> {
  const params: Record<string, string | string[]> = {};
  const address = new URLSearchParams(query);
  for (const name of address.keys()) {
    const all = address.getAll(name);
    params[name] = all.length > 1 ? all : all[0]!;
  }
  return renderToStaticMarkup(await HoodAirflowPage({ searchParams: Promise.resolve(params) }));
}

const ARM = 'hood=flanged-opening&velocity=0.5&distance=0.3&diameter=0.2';
const SIZES: Record<HoodName, string> = {
  ...{ 'plain-opening': 'distance=0.3&diameter=0.2', 'flanged-opening': 'distance=0.3&width=0.3&height=0.2' },
  ...{ 'bench-opening': 'distance=0.3&diameter=0.2', 'plain-slot': 'distance=0.3&width=0.5&height=0.05' },
  ...{
    'flanged-slot': 'distance=0.3&width=0.5&height=0.05',
    enclosure: 'openArea=0.06',
    canopy: 'distance=0.5&perimeter=3',
  },
};

describe('the hood page without scripts', () => {
  it('answers the question in its address', async () => {
    // By hand: 0.75 × 0.5 (0.9 + 0.0314159) = 0.349281 m3/s, 1257 m3/h, 740 cfm.
    expect(await pageAt(`${ARM}&units=si`)).toMatch(/data-result="airflow">1260<span[^>]*>\u2009m³\/h/);
    const us = 'hood=flanged-opening&velocity=0.5+m/s&distance=0.3+m&diameter=0.2+m&units=us';
    expect(await pageAt(us)).toMatch(/data-result="airflow">740<span[^>]*>\u2009cfm/);
  });

  it.each(HOODS)('draws and explains a %s without an inline style', async (hood) => {
    const html = await pageAt(`hood=${hood}&velocity=0.5&${SIZES[hood]}`);
    expect(html).not.toMatch(/\sstyle=/);
    expect(html).toMatch(/<svg[^>]*role="img"[^>]*aria-labelledby="[^"]+ [^"]+"/);
    expect(html).toMatch(/<desc[^>]*>[^<]*m³\/h[^<]*<\/desc>/);
    expect(html).toMatch(/<caption>Velocity (by|at)/);
    expect(html).toContain('The working, with the source of each equation');
    expect(html).not.toMatch(/NaN|Infinity|undefined/);
  });

  it('keeps what was typed and says beside the field what is wrong', async () => {
    const html = await pageAt('hood=plain-opening&velocity=fast&distance=0.3&diameter=0.2');
    expect(html).toContain('value="fast"');
    expect(html).toContain(
      '<p id="field-velocity-error" class="text-base font-semibold text-kiln">Write a number, such as 0.3.</p>',
    );
    expect(html).toMatch(/aria-describedby="field-velocity-hint field-velocity-error" aria-invalid="true"/);
    expect(html).not.toContain('data-result');
  });

  it('lists what is wrong with a link to its field', async () => {
    const html = await pageAt('hood=plain-opening&velocity=fast&distance=0.3&diameter=0.2');
    expect(html).toContain('<a href="#field-velocity">Velocity wanted: Write a number, such as 0.3.</a>');
    expect(html).toContain('id="field-velocity"');
    expect(await pageAt('velocity=0.5')).toContain('<a href="#field-hood">Choose the kind of hood.</a>');
  });

  it('says which number is missing, by its name on the page', async () => {
    const html = await pageAt('hood=plain-slot&velocity=0.5&width=0.5');
    expect(html).toContain('Distance from the hood to the source is missing: a plain slot needs it.');
    expect(html).toContain('Height is missing: a plain slot needs width and height.');
  });

  it('leads with the caution when the work itself forbids the sum', async () => {
    for (const work of ['unidentified', 'sprayed-isocyanates', 'combustible']) {
      const html = await pageAt(`${ARM}&work=${work}`);
      expect(html.indexOf(`data-code="${work}"`)).toBeGreaterThan(0);
      expect(html.indexOf(`data-code="${work}"`)).toBeLessThan(html.indexOf('data-result'));
    }
    expect(await pageAt(`${ARM}&work=unidentified`)).toContain('data-control="unknown"');
  });

  it('never calls a result safe', async () => expect(await pageAt(ARM)).not.toMatch(/\bsafe(ty|ly)?\b/i));

  it('links the same question in the other units, its table, and an example marked as invented', async () => {
    const html = (await pageAt(`${ARM}&units=si`)).replaceAll('&amp;', '&');
    expect(html).toContain(
      'href="/worksheets/hood-airflow?hood=flanged-opening&velocity=98.425&distance=11.811&diameter=7.874&units=us"',
    );
    expect(html).toContain(`href="/api/worksheets/hood-airflow/table.csv?${ARM}&units=si"`);
    const example = /href="\/worksheets\/hood-airflow\?([^"]+)">Load an invented example/.exec(html)![1]!;
    expect(await pageAt(example)).toContain('Invented example');
    expect(html).not.toContain('Invented example');
  });

  it('asks nothing at first and tolerates any address', async () => {
    expect(await pageAt('')).toContain('Nothing asked yet');
    for (const query of ['hood=tube', 'hood=canopy&hood=enclosure', 'velocity=%00%F0%9F', 'units=xx&work=xx&q=1'])
      expect(await pageAt(query)).not.toContain('data-result');
  });

  it('puts a hostile text into the page as text', async () => {
    const html = await pageAt(`hood=enclosure&openArea=${encodeURIComponent('"><script>x</script>')}`);
    expect(html).not.toContain('<script>');
    expect(html).toContain('&quot;&gt;&lt;script&gt;');
  });
});

it('lists the worksheets by the question each answers', () => {
  const html = renderToStaticMarkup(WorksheetsPage());
  expect(html).toContain('href="/worksheets/hood-airflow"');
  expect(html).toContain('How much air must it draw to catch what comes off?');
});
