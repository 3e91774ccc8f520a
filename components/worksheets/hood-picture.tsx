import type { HoodName } from '@/lib/air/hood-airflow';

/** Each hood from the side, the work as a dot. */
const PATHS: Record<HoodName, string> = {
  'plain-opening': 'M4 15H30M4 33H30',
  'flanged-opening': 'M4 17H30V5M4 31H30V43',
  'bench-opening': 'M4 24H30M4 40H60',
  'plain-slot': 'M4 12L20 20H30M4 36L20 28H30',
  'flanged-slot': 'M4 12L20 20H30V5M4 36L20 28H30V43',
  enclosure: 'M10 34V8H28V3M36 3V8H54V34M10 40V44H54V40',
  canopy: 'M28 3V9L12 18M36 3V9L52 18M18 36V44H46V36',
};
const DOTS: Record<HoodName, [number, number]> = {
  ...{ 'plain-opening': [48, 24], 'flanged-opening': [48, 24], 'bench-opening': [48, 36], 'plain-slot': [48, 24] },
  ...{ 'flanged-slot': [48, 24], enclosure: [32, 36], canopy: [32, 36] },
};

export function HoodPicture({ hood }: { hood: HoodName }) {
  const [x, y] = DOTS[hood];
  return (
    <svg viewBox="0 0 64 48" aria-hidden="true" focusable="false" className="h-12 w-16 shrink-0">
      <path d={PATHS[hood]} className="fill-none stroke-ink" strokeWidth="2.2" strokeLinejoin="round" />
      <circle cx={x} cy={y} r="3.4" className="fill-brass" />
    </svg>
  );
}
