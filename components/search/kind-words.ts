import type { SearchKind } from '@/lib/search/search';

/** What a kind is called over one hit, and over many. */
export const KIND_WORDS: Record<SearchKind, { one: string; many: string }> = {
  material: { one: 'Material', many: 'Materials' },
  process: { one: 'Process', many: 'Processes' },
  substance: { one: 'Substance', many: 'Substances' },
  guide: { one: 'Guide', many: 'Guides' },
  worksheet: { one: 'Worksheet', many: 'Worksheets' },
  sheet: { one: 'Safety data sheet', many: 'Safety data sheets' },
};
