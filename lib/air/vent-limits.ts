export const VENTS = ['natural-draught', 'fan-assisted', 'power-vented', 'direct-vent', 'open-hearth'] as const;
export type Vent = (typeof VENTS)[number];

const BPI = 'Building Performance Institute, building analyst depressurisation limits, seen reprinted in an audit form';

/**
 * How an appliance sends its gas out and how far below outdoors, in Pa and with its sign, its room may be. `pulls`: nothing but the
 * draught of its flue takes the gas away.
 */
export type VentKind = { name: string; limit: number; pulls: boolean; source: string };

/** Where the sources give several limits for one kind, the strictest stands here. */
export const VENT_KINDS: Record<Vent, VentKind> = {
  'natural-draught': {
    ...{ name: 'natural draught, by a flue or chimney', limit: -2, pulls: true },
    source: `${BPI}: −2 for a water heater alone on its flue, −3 with a furnace on the same, −5 for a furnace or boiler by itself`,
  },
  'fan-assisted': { name: 'fan-assisted', limit: -15, pulls: false, source: `${BPI}: −15` },
  'power-vented': { name: 'power-vented', limit: -15, pulls: false, source: `${BPI}: −15` },
  'direct-vent': { name: 'sealed, with air of its own from outdoors', limit: -50, pulls: false, source: `${BPI}: −50` },
  'open-hearth': {
    ...{ name: 'open hearth or wood stove', limit: -2, pulls: true },
    source: 'From memory: no confirmed figure was found; treated as the most sensitive, 2 to 5 Pa below',
  },
};
