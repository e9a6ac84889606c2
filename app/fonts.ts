import localFont from 'next/font/local';

export const words = localFont({
  src: '../node_modules/@fontsource-variable/overpass/files/overpass-latin-wght-normal.woff2',
  weight: '100 900',
  variable: '--font-overpass',
  display: 'swap',
});

export const figures = localFont({
  src: '../node_modules/@fontsource-variable/overpass-mono/files/overpass-mono-latin-wght-normal.woff2',
  weight: '300 700',
  variable: '--font-overpass-mono',
  display: 'swap',
  // Figures stand in every first view, but a late mono face only shifts digits that are already as wide.
  fallback: ['ui-monospace', 'monospace'],
});
