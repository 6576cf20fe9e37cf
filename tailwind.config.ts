/**
 * The shop's own tokens. Each colour is a CSS variable, so that day and night shift are one set of classes and two sets of values.
 * The style sheet takes this file in with `@config`, after `@import "tailwindcss"`.
 */
import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

const day = {
  room: '#dfe6e0',
  panel: '#f3f6f2',
  well: '#ffffff',
  ink: '#17211d',
  soft: '#4d5b54',
  head: '#1f4a41',
  enamel: '#1f4a41',
  'on-enamel': '#f3f6f2',
  blue: '#27408b',
  lead: '#b23a1e',
  brass: '#7d5c0c',
  rule: '#b4c1b8',
  rule2: '#6b7c73',
  'wash-blue': '#e3e8f4',
  'wash-lead': '#f8e9e4',
  'wash-brass': '#f3ecd9',
  sheet: '#ffffff',
  'sheet-ink': '#17211d',
};

const night: Record<keyof typeof day, string> = {
  room: '#141b18',
  panel: '#1c2521',
  well: '#121917',
  ink: '#dbe5de',
  soft: '#9fb1a7',
  head: '#9cc9ba',
  enamel: '#2a5f52',
  'on-enamel': '#eef5f1',
  blue: '#9db2f2',
  lead: '#f0937a',
  brass: '#d8b562',
  rule: '#3b4a43',
  rule2: '#6d8076',
  'wash-blue': '#222d45',
  'wash-lead': '#3a241d',
  'wash-brass': '#332c18',
  sheet: '#0f1513',
  'sheet-ink': '#e3ece6',
};

function variables(colours: Record<string, string>): Record<string, string> {
  return Object.fromEntries(Object.entries(colours).map(([name, value]) => [`--${name}`, value]));
}

const config: Config = {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    // Whole scales are replaced, not extended: a colour or a size outside these is a slip.
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      inherit: 'inherit',
      ...Object.fromEntries(Object.keys(day).map((name) => [name, `var(--${name})`])),
    },
    fontFamily: {
      mono: ['"JetBrains Mono"', 'monospace'],
      sans: ['"JetBrains Mono"', 'monospace'],
    },
    fontSize: {
      12: ['12px', '16px'],
      14: ['14px', '20px'],
      16: ['16px', '24px'],
      20: ['20px', '28px'],
      28: ['28px', '36px'],
      // Read from two metres, at the bench only.
      44: ['44px', '48px'],
      56: ['56px', '60px'],
      96: ['96px', '100px'],
    },
    fontWeight: { reading: '400', figure: '500', rank: '700', stamp: '800' },
    borderRadius: { none: '0', DEFAULT: '2px', full: '9999px' },
    boxShadow: { none: 'none', sheet: '0 1px 3px rgb(23 33 29 / 0.25)' },
    letterSpacing: { normal: '0', plate: '0.14em' },
    screens: { narrow: '360px', tablet: '768px', desk: '1024px', wide: '1280px' },
  },
  plugins: [
    plugin(({ addBase }) => {
      addBase({
        ':root': { ...variables(day), colorScheme: 'light' },
        '@media (prefers-color-scheme: dark)': {
          ':root:not([data-shift="day"])': { ...variables(night), colorScheme: 'dark' },
        },
        ':root[data-shift="night"]': { ...variables(night), colorScheme: 'dark' },
      });
    }),
  ],
};

export default config;
