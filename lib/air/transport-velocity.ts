import { fromFpm } from '@/lib/units/convert';
import { metresPerSecond, type MetresPerSecond } from '@/lib/units/quantity';

export const CARRIED = ['gas', 'fume', 'light-dust', 'dry-dust', 'industrial-dust', 'heavy-dust'] as const;
export type Carried = (typeof CARRIED)[number];

type Standard = { least: MetresPerSecond; source: string };
/** What is carried, and how fast the air must go so that it does not settle, by two standards that differ by nearly two. */
export type Transport = { name: string; standards: Standard[] };

const AMERICAN = 'guidance after ACGIH (Philippine air-pollution guidance, Annex 5)';
const IRISH = 'Health and Safety Authority of Ireland, guidance on local exhaust ventilation';
const us = (fpm: number): Standard => ({ least: fromFpm(fpm), source: AMERICAN });
const ie = (velocity: number): Standard => ({ least: metresPerSecond(velocity), source: IRISH });

export const TRANSPORT: Record<Carried, Transport> = {
  gas: { name: 'gas, vapour, smoke', standards: [us(1000), ie(5)] },
  fume: { name: 'welding and soldering fume', standards: [us(2000), ie(10)] },
  'light-dust': { name: 'very fine light dust, fine wood dust', standards: [us(2500), ie(12.5)] },
  'dry-dust': { name: 'dry dust and powder', standards: [us(3000), ie(15)] },
  'industrial-dust': { name: 'average industrial dust, grinding', standards: [us(3500)] },
  'heavy-dust': { name: 'heavy dust, chips, metal', standards: [us(4000)] },
};
