import { hoodAirflow } from '@/lib/worksheets/hood-airflow/about';
import type { Worksheet } from './worksheet';

/** Every worksheet there is, in the order they are listed. A new one is a folder beside this file and a line here. */
export const WORKSHEETS: readonly Worksheet[] = [hoodAirflow];

/** The worksheet of that name, as it stands in an address. */
export const worksheetNamed = (name: string) => WORKSHEETS.find((each) => each.name === name);
