/** Markdown as running text: citation marks, link targets, marks of emphasis, headings and tables fall away; the words stay. */
export const plainText = (markdown: string): string =>
  markdown
    .replace(/\[\^[\w-]+\]:?/g, ' ')
    .replace(/!?\[([^\]]*)\]\([^)\s]*\)/g, '$1')
    .replace(/<[^>\n]{0,200}>/g, ' ')
    .replace(/^[#>\s]+/gm, '')
    .replace(/[*_`|~]+|-{2,}/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();
