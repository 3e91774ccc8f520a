import { defaultSchema } from 'hast-util-sanitize';
import type { Link, PhrasingContent, Root, Text } from 'mdast';
import { remark } from 'remark';
import remarkGfm from 'remark-gfm';
import remarkHtml from 'remark-html';
import { visit } from 'unist-util-visit';
import { MARKS } from './citations';

/** What may come out: text, tables and links within the site and to https; no image, no raw HTML, no id but a heading's. */
const SCHEMA = {
  ...defaultSchema,
  clobberPrefix: '',
  tagNames: (defaultSchema.tagNames ?? []).filter((name) => !['img', 'input', 'picture', 'source'].includes(name)),
  protocols: { ...defaultSchema.protocols, href: ['https'] },
  attributes: {
    ...defaultSchema.attributes,
    '*': [],
    a: ['href', ['className', 'source-number'], ['rel', 'nofollow']],
    span: [['className', 'mark']],
    h2: ['id'],
    h3: ['id'],
    h4: ['id'],
    th: ['align', ['scope', 'col']],
    td: ['align'],
  },
};

const textOf = (node: { value?: string; children?: unknown[] }): string =>
  node.value ?? (node.children ?? []).map((child) => textOf(child as { value?: string })).join('');

/** The anchor of a heading: its words, lower-case, joined by hyphens; a second one alike gets a number. */
function anchors() {
  const seen = new Map<string, number>();
  return (words: string) => {
    const slug = `s-${
      words
        .normalize('NFKD')
        .toLowerCase()
        .replace(/[^a-z0-9]+/g, '-')
        .replace(/^-|-$/g, '') || 'part'
    }`;
    const count = seen.get(slug) ?? 0;
    seen.set(slug, count + 1);
    return count === 0 ? slug : `${slug}-${count + 1}`;
  };
}

function numberedSources(sources: string[]) {
  return (tree: Root) => {
    const next = anchors();
    visit(tree, 'heading', (heading) => {
      heading.data = { ...heading.data, hProperties: { id: next(textOf(heading)) } };
    });
    visit(tree, 'footnoteReference', (node, at, parent) => {
      const mark = MARKS[node.identifier];
      const n = sources.indexOf(node.identifier) + 1;
      const text: Text = { type: 'text', value: mark ? `[${mark}]` : `[${n}]` };
      const shown: PhrasingContent = mark
        ? ({
            type: 'emphasis',
            children: [text],
            data: { hName: 'span', hProperties: { className: ['mark'] } },
          } as PhrasingContent)
        : ({
            type: 'link',
            url: `#source-${n}`,
            children: [text],
            data: { hProperties: { className: ['source-number'] } },
          } as Link);
      parent!.children.splice(at!, 1, shown as never);
    });
    tree.children = tree.children.filter(({ type }) => type !== 'footnoteDefinition' && type !== 'html');
    visit(tree, (node, at, parent) => {
      if ((node.type === 'image' || node.type === 'imageReference' || node.type === 'html') && parent)
        parent.children.splice(at!, 1);
    });
  };
}

/**
 * An entry's text as HTML: GitHub-flavoured Markdown, sanitised, headings with anchors, `[^id]` as the number of the source in
 * `sources`, `[^memory]` and `[^practice]` as marks.
 */
export function renderBody(body: string, sources: string[]): string {
  const definitions = [...sources, ...Object.keys(MARKS)].map((id) => `[^${id}]: ${id}`).join('\n\n');
  const file = remark()
    .use(remarkGfm, { singleTilde: false })
    .use(() => numberedSources(sources))
    .use(remarkHtml, { sanitize: SCHEMA as never })
    .processSync(`${body}\n\n${definitions}\n`);
  return String(file);
}
