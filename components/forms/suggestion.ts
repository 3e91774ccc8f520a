import { KIND_WORDS } from '@/components/search/kind-words';
import type { ControlAnswer } from '@/lib/entries/vocabulary';
import type { PairAnswer, SearchHit } from '@/lib/search/search';

/** One line of a combobox's list. `text` is what is put into the field; `url` is where it leads, when it leads anywhere. */
export type Suggestion = { key: string; text: string; note?: string; control?: ControlAnswer; url?: string };

/** Fetches suggestions for a text; rejects when `signal` aborts. */
export type LoadSuggestions = (text: string, signal: AbortSignal) => Promise<Suggestion[]>;

type Answer = { hits: SearchHit[]; pair?: PairAnswer };

const words = (slug: string) => slug.replaceAll('-', ' ');

const fromPair = ({ materials, process, control, url }: PairAnswer): Suggestion => ({
  key: 'pair',
  text: `${materials.map(words).join(' + ')} × ${words(process)}`,
  note: 'Check',
  control,
  url,
});

const fromHit = ({ kind, slug, title, url, control }: SearchHit): Suggestion => ({
  key: `${kind}:${slug}`,
  text: title,
  note: KIND_WORDS[kind].one,
  ...(control ? { control } : {}),
  url,
});

/** Suggestions from an address that answers as the search does; `q` is added to it. A material × process answer comes first. */
export const suggestionsFrom =
  (address: string): LoadSuggestions =>
  async (text, signal) => {
    const joint = address.includes('?') ? '&' : '?';
    const response = await fetch(`${address}${joint}q=${encodeURIComponent(text)}`, { signal });
    if (!response.ok) throw new Error(`suggestions: ${response.status}`);
    const { hits, pair } = (await response.json()) as Answer;
    return [...(pair ? [fromPair(pair)] : []), ...hits.map(fromHit)];
  };
