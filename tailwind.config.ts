import type { Config } from 'tailwindcss';

/** Every colour is a custom property of app/globals.css, so that the light and the dark theme share the classes. */
const token = (name: string) => `var(--${name})`;

export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: token('paper'),
      leaf: token('leaf'),
      ink: token('ink'),
      ink2: token('ink2'),
      line: token('line'),
      hair: token('hair'),
      blue: token('blue'),
      'blue-wash': token('blue-wash'),
      brass: token('brass'),
      'brass-wash': token('brass-wash'),
      oxide: token('oxide'),
      'oxide-wash': token('oxide-wash'),
    },
    fontFamily: {
      sans: ['"IBM Plex Sans"', 'system-ui', 'sans-serif'],
      mono: ['"IBM Plex Mono"', 'ui-monospace', 'monospace'],
    },
    borderRadius: { none: '0', DEFAULT: '3px' },
    boxShadow: {},
  },
} satisfies Config;
