import localFont from 'next/font/local';

/** Interface and headings. The width axis sets labels and table heads slightly condensed. */
export const archivo = localFont({
  src: '../node_modules/@fontsource-variable/archivo/files/archivo-latin-wdth-normal.woff2',
  weight: '100 900',
  declarations: [{ prop: 'font-stretch', value: '62% 125%' }],
  variable: '--font-archivo',
  display: 'swap',
});

/** The reading text of an entry. */
export const newsreader = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/newsreader/files/newsreader-latin-wght-normal.woff2',
      weight: '200 800',
      style: 'normal',
    },
    {
      path: '../node_modules/@fontsource-variable/newsreader/files/newsreader-latin-wght-italic.woff2',
      weight: '200 800',
      style: 'italic',
    },
  ],
  variable: '--font-newsreader',
  display: 'swap',
  preload: false,
  adjustFontFallback: 'Times New Roman',
});

/** Figures, formulas, CAS numbers. */
export const spline = localFont({
  src: '../node_modules/@fontsource-variable/spline-sans-mono/files/spline-sans-mono-latin-wght-normal.woff2',
  weight: '300 700',
  variable: '--font-spline',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
});
