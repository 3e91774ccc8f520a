/** Levels of carbon monoxide, each a named body's own and none of them a line between harm and none. */
export type MonoxideLevel = { body: string; value: number; unit: 'ppm' | 'mg/m3'; over: string; source: string };

export const MONOXIDE_LEVELS: readonly MonoxideLevel[] = [
  { body: 'NIOSH', value: 35, unit: 'ppm', over: 'a shift', source: 'NIOSH Pocket Guide: REL' },
  { body: 'NIOSH', value: 200, unit: 'ppm', over: 'never to be passed', source: 'NIOSH Pocket Guide: ceiling' },
  { body: 'OSHA', value: 50, unit: 'ppm', over: 'eight hours', source: '29 CFR 1910.1000, Table Z-1' },
  {
    body: 'ACGIH',
    value: 25,
    unit: 'ppm',
    over: 'eight hours',
    source: 'NIOSH IDLH documentation (1994), quoting the TLV',
  },
  { body: 'NIOSH', value: 1200, unit: 'ppm', over: 'danger to life at once', source: 'NIOSH IDLH, revised (1994)' },
  { body: 'EPA', value: 9, unit: 'ppm', over: 'eight hours outdoors', source: 'From memory: 40 CFR 50.8' },
  { body: 'WHO', value: 4, unit: 'mg/m3', over: '24 hours', source: 'From memory: WHO air quality guidelines (2021)' },
  { body: 'UL', value: 70, unit: 'ppm', over: 'an alarm after one to four hours', source: 'From memory: UL 2034' },
  { body: 'UL', value: 150, unit: 'ppm', over: 'an alarm after 10 to 50 minutes', source: 'From memory: UL 2034' },
  { body: 'UL', value: 400, unit: 'ppm', over: 'an alarm after 4 to 15 minutes', source: 'From memory: UL 2034' },
];
