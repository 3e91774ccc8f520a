import { JSDOM } from 'jsdom';
import { describe, expect, it } from 'vitest';
import { renderBody } from '@/lib/entries/render-body';

const dom = (body: string, sources: string[] = []) => new JSDOM(renderBody(body, sources)).window.document.body;

describe('the text of an entry', () => {
  it('numbers sources by the list, not by their order in the text', () => {
    const links = [...dom('First[^b], then[^a].', ['a', 'b']).querySelectorAll('a')];
    expect(links.map((link) => [link.textContent, link.getAttribute('href')])).toEqual([
      ['[2]', '#source-2'],
      ['[1]', '#source-1'],
    ]);
  });

  it('marks what is from memory or common practice', () => {
    expect(dom('A[^memory]. B[^practice].').textContent).toContain('[from memory]');
    expect(dom('A[^memory]. B[^practice].').textContent).toContain('[common practice, no source]');
  });

  it('gives each heading an anchor of its own', () => {
    const ids = [...dom('## How much that is\n\nA\n\n## How much that is\n\nB').querySelectorAll('h2')].map(
      (heading) => heading.id,
    );
    expect(ids).toEqual(['s-how-much-that-is', 's-how-much-that-is-2']);
  });

  it('keeps tables and lists', () => {
    const body = dom('| a | b |\n| --- | --- |\n| 1 | 2 |\n\n1. one\n2. two');
    expect(body.querySelectorAll('td').length).toBe(2);
    expect(body.querySelectorAll('ol > li').length).toBe(2);
  });

  it.each([
    '<script>alert(1)</script>',
    '[x](javascript:alert(1))',
    '[x](jAvAsCrIpT:alert(1))',
    '[x](java&#x0A;script:alert(1))',
    '[x](data:text/html,<script>alert(1)</script>)',
    '[x](vbscript:x)',
    '[x][y]\n\n[y]: javascript:alert(1)',
    '<javascript:alert(1)>',
    '<img src=x onerror=alert(1)>',
    '![tracker](http://evil.example/p.png)',
    '![tracker][t]\n\n[t]: https://evil.example/p.png',
    '<svg><animate onbegin=alert(1) attributeName=x dur=1s></svg>',
    '<math><mtext></mtext></math>',
    '<iframe srcdoc="<script>alert(1)</script>"></iframe>',
    '<style>body{display:none}</style>',
    '<form action="https://evil.example"><input name=q></form>',
    '<base href="https://evil.example">',
    '<a id="getElementById" name="cookie">x</a>',
    '<noscript><p title="</noscript><img src=x onerror=alert(1)>">',
    '<div style="background:url(https://evil.example)">x</div>',
    'text <b onmouseover=alert(1)>bold</b>',
  ])('lets nothing act in %s', (attack) => {
    const body = dom(attack);
    expect(
      body.querySelectorAll('script, img, svg, math, iframe, style, form, input, base, object, embed, link, meta')
        .length,
    ).toBe(0);
    for (const element of body.querySelectorAll('*'))
      for (const { name, value } of element.attributes) {
        expect(name).not.toMatch(/^on|^style$|^name$/i);
        if (name === 'id') expect(value).toMatch(/^s-/);
        if (name === 'href') expect(value).toMatch(/^(https:\/\/|#|\/)/);
      }
  });
});
