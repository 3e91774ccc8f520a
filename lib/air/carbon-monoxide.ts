/** Levels of carbon monoxide, each a named body's own and none of them a line between harm and none. */
export type MonoxideLevel = { body: string; value: number; unit: 'ppm' | 'mg/m3'; over: string; source: string };

const ppm = (body: string, value: number, over: string, source: string): MonoxideLevel => ({
  ...{ body, value, unit: 'ppm', over, source },
});
const who = (value: number, over: string, source: string): MonoxideLevel => ({
  ...{ body: 'WHO', value, unit: 'mg/m3', over, source },
});

const ALARM = 'UL 2034, as an alarm maker’s manual prints it';
const OUTDOORS = 'From memory: 40 CFR 50.8';
const INDOORS = 'From memory: WHO guidelines for indoor air quality (2010)';

export const MONOXIDE_LEVELS: readonly MonoxideLevel[] = [
  ppm('NIOSH', 35, 'a shift', 'NIOSH Pocket Guide: REL'),
  ppm('NIOSH', 200, 'never to be passed', 'NIOSH Pocket Guide: ceiling'),
  ppm('NIOSH', 1200, 'danger to life at once', 'NIOSH IDLH, revised (1994); 1500 before'),
  ppm('OSHA', 50, 'eight hours', '29 CFR 1910.1000, Table Z-1'),
  ppm('ACGIH', 25, 'eight hours', 'NIOSH IDLH documentation (1994), quoting the TLV'),
  ppm('EPA', 9, 'eight hours outdoors', OUTDOORS),
  ppm('EPA', 35, 'one hour outdoors', OUTDOORS),
  who(4, '24 hours', 'From memory: WHO air quality guidelines (2021)'),
  who(7, '24 hours indoors', INDOORS),
  who(10, 'eight hours indoors', INDOORS),
  who(35, 'one hour indoors', INDOORS),
  who(100, '15 minutes indoors', INDOORS),
  ppm('UL', 30, 'an alarm stays silent for 30 days', ALARM),
  ppm('UL', 70, 'an alarm after one to four hours', ALARM),
  ppm('UL', 150, 'an alarm after 10 to 50 minutes', ALARM),
  ppm('UL', 400, 'an alarm after 4 to 15 minutes', ALARM),
];
