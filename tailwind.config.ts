import type { Config } from 'tailwindcss';

/** Names for the tokens of `app/globals.css`; no colour value stands anywhere else. */
const token = (name: string) => `var(--${name})`;

export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  darkMode: [
    'variant',
    [
      '@media (prefers-color-scheme: dark) { &:where([data-theme="system"], [data-theme="system"] *) }',
      '&:where([data-theme="dark"], [data-theme="dark"] *)',
    ],
  ],
  theme: {
    extend: {
      colors: {
        ground: token('ground'),
        panel: token('panel'),
        raised: token('raised'),
        line: token('line'),
        ink: token('ink'),
        soft: token('soft'),
        faint: token('faint'),
        lamp: token('lamp'),
        'on-lamp': token('on-lamp'),
        frozen: token('frozen'),
        urgent: token('urgent'),
        closing: token('closing'),
        hold: token('hold'),
        safe: token('safe'),
        sea: token('sea'),
        shore: token('shore'),
      },
      fontFamily: {
        sans: ['var(--font-overpass)', 'system-ui', 'sans-serif'],
        mono: ['var(--font-overpass-mono)', 'ui-monospace', 'monospace'],
      },
    },
  },
} satisfies Config;
