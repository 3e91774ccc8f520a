import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

/** The colours of the product. Nowhere else is one written down. */
const LIGHT = {
  ground: '#EDF1F2',
  surface: '#FFFFFF',
  ink: '#12262B',
  quiet: '#4C6167',
  rule: '#C6D1D4',
  link: '#0A6463',
  brass: '#B67A12',
  kiln: '#B23A0E',
};
type Palette = typeof LIGHT;

const DARK: Palette = {
  ground: '#0E191C',
  surface: '#15242A',
  ink: '#E4EDEF',
  quiet: '#9DB2B8',
  rule: '#2B4047',
  link: '#5CC7C0',
  brass: '#E9B44C',
  kiln: '#FF8A5C',
};

const PAPER: Palette = {
  ground: '#FFFFFF',
  surface: '#FFFFFF',
  ink: '#000000',
  quiet: '#333333',
  rule: '#777777',
  link: '#000000',
  brass: '#000000',
  kiln: '#000000',
};

const variables = (palette: Palette, scheme: 'light' | 'dark') => ({
  ...Object.fromEntries(Object.entries(palette).map(([name, value]) => [`--${name}`, value])),
  'color-scheme': scheme,
});

/** The system decides, unless a choice is marked on <html> or, without scripts, ticked in the bar. */
const CHOSEN_DARK = "html[data-theme='dark'], html:not([data-theme]):has(#theme-dark:checked)";
const SYSTEM = "html[data-theme='system'], html:not([data-theme]):not(:has(#theme-light:checked))";

/** On paper, above every choice: two ids that nothing has outweigh the one in the selectors above. */
const PRINTED = ':root:not(#on-screen):not(#on-glass)';

const palettes = plugin(({ addBase }) => {
  addBase({ ':root': variables(LIGHT, 'light') });
  addBase({ '@media (prefers-color-scheme: dark)': { [SYSTEM]: variables(DARK, 'dark') } });
  addBase({ [CHOSEN_DARK]: variables(DARK, 'dark') });
  addBase({ '@media print': { [PRINTED]: variables(PAPER, 'light') } });
});

const colors = Object.fromEntries(Object.keys(LIGHT).map((name) => [name, `var(--${name})`]));

const config: Config = {
  theme: {
    extend: {
      colors,
      fontFamily: {
        sans: ['var(--font-archivo)', 'system-ui', 'sans-serif'],
        reading: ['var(--font-newsreader)', 'Georgia', 'serif'],
        mono: ['var(--font-spline)', 'ui-monospace', 'monospace'],
      },
      maxWidth: { page: '76rem', measure: '29em' },
    },
  },
  plugins: [palettes],
};

export default config;
