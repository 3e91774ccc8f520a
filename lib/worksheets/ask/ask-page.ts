import { askWorksheet, type Asked } from './ask-worksheet';
import type { Ask } from './fields';
import { typedOf } from './request';
import { withoutRow, withRow } from './rows';
import { paramsOf, typedFrom, type Typed } from './typed';
import type { LibraryFacts } from '@/lib/worksheets/facts';
import type { Worksheet } from '@/lib/worksheets/worksheet';

/** The question in an address, with the row that a button without scripts asked to add or to take away. */
function typedWithRows(ask: Ask, address: URLSearchParams): Typed {
  const typed = typedFrom(ask, address);
  const [add, remove] = [address.get('add'), address.get('remove')];
  if (add) return withRow(ask, typed, add);
  return remove ? withoutRow(ask, typed, remove) : typed;
}

/** What a page shows of the question in its address: what comes of it, or only the form where a row was added or taken away. */
export function askPage(worksheet: Worksheet, ask: Ask, address: URLSearchParams, facts: LibraryFacts): Asked {
  const typed = typedWithRows(ask, address);
  if (address.has('add') || address.has('remove')) return { typed, state: 'blank' };
  return askWorksheet(worksheet, ask, paramsOf(typed), facts);
}

/** The address of an example: in SI, so that it opens in the reader's units. */
export function exampleAddress(ask: Ask, example: object): string {
  const params = paramsOf(typedOf(ask, example));
  params.delete('units');
  return `/worksheets/${ask.name}?${params}`;
}
