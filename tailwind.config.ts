import type { Config } from 'tailwindcss';

const token = (name: string) => `var(--${name})`;

const config = {
  content: ['./app/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: token('paper'),
      sheet: token('sheet'),
      line: token('line'),
      ink: token('ink'),
      'ink-soft': token('ink-soft'),
      lamp: token('lamp'),
      'lamp-ink': token('lamp-ink'),
      'lamp-fill': token('lamp-fill'),
      ember: token('ember'),
      'ember-ink': token('ember-ink'),
      moss: token('moss'),
      frost: token('frost'),
      slate: token('slate'),
      chip: token('chip'),
      'on-chip': token('on-chip'),
      hatch: token('hatch'),
      leaf: token('leaf'),
      'leaf-back': token('leaf-back'),
      water: token('water'),
    },
    fontFamily: { sans: ['Lexend', 'system-ui', 'sans-serif'] },
    fontSize: {
      12: ['0.75rem', { lineHeight: '1.0625rem' }],
      14: ['0.875rem', { lineHeight: '1.25rem' }],
      17: ['1.0625rem', { lineHeight: '1.5rem' }],
      22: ['1.375rem', { lineHeight: '1.75rem', letterSpacing: '-0.01em' }],
      30: ['1.875rem', { lineHeight: '2.25rem', letterSpacing: '-0.015em' }],
      34: ['2.125rem', { lineHeight: '2.75rem', letterSpacing: '-0.015em' }],
    },
    fontWeight: { light: '300', normal: '400', semibold: '600' },
    screens: { sm: '640px', md: '700px', lg: '1100px', xl: '1280px' },
  },
  plugins: [],
} satisfies Config;

export default config;
