import Link from 'next/link';
import { SYSTEMS, type System } from '@/lib/units/kinds';
import { addressOf, inUnits, type Typed } from '@/lib/worksheets/hood-airflow/address';

const NAMES: Record<System, string> = { si: 'metres and m³/h', us: 'inches, fpm and cfm' };

/** The same question in the other units: a link, so that a typed number never changes its meaning by a tick. */
export function UnitsLinks({ typed }: { typed: Typed }) {
  return SYSTEMS.filter((system) => system !== typed.units).map((system) => (
    <Link key={system} href={addressOf(inUnits(typed, system))} prefetch={false} scroll={false}>
      Use {NAMES[system]}
    </Link>
  ));
}
