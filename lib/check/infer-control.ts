import type { Material, Process } from '@/lib/entries/schema';
import type { Control } from '@/lib/entries/vocabulary';

export type Inference = { control: Control; text: string };

const HALOGENS: Record<string, string> = {
  F: 'fluorine leaves as hydrogen fluoride and worse',
  Cl: 'chlorine leaves as hydrogen chloride',
  Br: 'bromine leaves as hydrogen bromide',
  I: 'iodine leaves as hydrogen iodide',
};
const NEVER_HEATED: Record<string, string> = { Be: 'beryllium', As: 'arsenic', Cd: 'cadmium' };
const METALS = new Set(['Cr', 'Ni', 'Pb', 'Mn', 'Zn', 'Cu', 'Co', 'Sb', 'Sn']);

type Rule = (concern: string[], process: Process) => Inference | undefined;

/** Halogen in the composition and heat that breaks it up: the acid leaves with the smoke. */
const halogenAndHeat: Rule = (concern, { heat }) => {
  const halogen = concern.find((symbol) => symbol in HALOGENS);
  if (heat !== 'decomposes' || !halogen) return undefined;
  return { control: 'prohibited', text: `Heat breaks this material up, and its ${HALOGENS[halogen]}.` };
};

const poisonMetal: Rule = (concern, { heat }) => {
  const metal = concern.find((symbol) => symbol in NEVER_HEATED);
  if (!metal || heat === 'cold') return undefined;
  return {
    control: 'prohibited',
    text: `It may hold ${NEVER_HEATED[metal]}, whose dust or fume harms at very low levels.`,
  };
};

const nitrogenOrSulphurAndHeat: Rule = (concern, { heat }) => {
  const element = concern.includes('N') ? 'nitrogen' : concern.includes('S') ? 'sulphur' : undefined;
  if (!element || (heat !== 'decomposes' && heat !== 'melts')) return undefined;
  const gases = element === 'nitrogen' ? 'hydrogen cyanide or ammonia' : 'sulphur dioxide or hydrogen sulphide';
  return { control: 'enclosed exhaust', text: `It holds ${element}, which heat can turn into ${gases}.` };
};

const metalAndHeat: Rule = (concern, { heat }) => {
  if (!concern.some((symbol) => METALS.has(symbol)) || (heat !== 'decomposes' && heat !== 'abrades')) return undefined;
  const control = heat === 'decomposes' ? 'enclosed exhaust' : 'local exhaust';
  return {
    control,
    text: `It holds ${concern.filter((symbol) => METALS.has(symbol)).join(', ')}, which leaves as fume or dust.`,
  };
};

const heatAlone: Rule = (_, { heat }) => {
  if (heat === 'decomposes')
    return {
      control: 'enclosed exhaust',
      text: 'Heat that breaks a material up makes smoke, gases and fine particles.',
    };
  if (heat === 'melts' || heat === 'warms')
    return { control: 'local exhaust', text: 'Warm material gives off vapour and fine particles.' };
  if (heat === 'abrades')
    return { control: 'local exhaust', text: 'Cutting it by edge or grit makes dust that can be breathed in.' };
  return undefined;
};

const RULES: Rule[] = [halogenAndHeat, poisonMetal, nitrogenOrSulphurAndHeat, metalAndHeat, heatAlone];

/**
 * What composition and heat say about a pair that nobody has reviewed; undefined when they say nothing. Never looser than local
 * exhaust: an inference may warn, it may not permit.
 */
export function inferControl(material: Material, process: Process): Inference | undefined {
  for (const rule of RULES) {
    const inference = rule(material.composition.concern, process);
    if (inference) return inference;
  }
  return undefined;
}
