import { EXAMPLES } from '@/lib/worksheets/examples';
import type { Ask } from './fields';
import { typedOf } from './request';
import type { Typed } from './typed';

/** The texts that say something, in the order of the form. */
const said = ({ texts }: Typed) => JSON.stringify([...texts].filter(([, all]) => all.some((text) => text !== '')));

/** Whether a typed question is the invented example of its worksheet, in whichever units. */
export function isExample(ask: Ask, typed: Typed): boolean {
  const example = EXAMPLES[ask.name];
  return example !== undefined && said(typedOf(ask, example, typed.units)) === said(typed);
}
