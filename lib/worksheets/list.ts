import { clearingTime } from '@/lib/worksheets/clearing-time/about';
import { dilution } from '@/lib/worksheets/dilution/about';
import { ductPressure } from '@/lib/worksheets/duct-pressure/about';
import { exposure } from '@/lib/worksheets/exposure/about';
import { fanDuty } from '@/lib/worksheets/fan-duty/about';
import { hoodAirflow } from '@/lib/worksheets/hood-airflow/about';
import { release } from '@/lib/worksheets/release/about';
import { roomBalance } from '@/lib/worksheets/room-balance/about';
import type { Worksheet } from './worksheet';

/** Every worksheet there is, in the order they are listed. A new one is a folder beside this file and a line here. */
export const WORKSHEETS: readonly Worksheet[] = [
  ...[hoodAirflow, ductPressure, fanDuty, roomBalance],
  ...[dilution, clearingTime, release, exposure],
];

/** The worksheet of that name, as it stands in an address. */
export const worksheetNamed = (name: string) => WORKSHEETS.find((each) => each.name === name);
