import type { Config } from 'tailwindcss';

/** Colours are CSS variables, set for light and dark in `app/globals.css`. */
const colour = (name: string) => `var(--${name})`;

const config: Config = {
  content: [
    './app/**/*.{ts,tsx,mdx}',
    './components/**/*.{ts,tsx}',
    './content/**/*.mdx',
    './mdx-components.tsx',
  ],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: colour('paper'),
      board: colour('board'),
      rule: colour('rule'),
      ink: colour('ink'),
      pencil: colour('pencil'),
      chalk: colour('chalk'),
      brass: colour('brass'),
      'brass-fill': colour('brass-fill'),
      'on-brass': colour('on-brass'),
      timber: colour('timber'),
      leaf: colour('leaf'),
      madder: colour('madder'),
      plum: colour('plum'),
    },
    borderRadius: { none: '0', DEFAULT: '2px', full: '9999px' },
    extend: {
      fontFamily: {
        heading: ['var(--font-besley)', 'Georgia', 'serif'],
        text: ['var(--font-text)', 'system-ui', 'sans-serif'],
        mono: ['var(--font-mono)', 'ui-monospace', 'monospace'],
      },
      maxWidth: { measure: '68ch', page: '1100px' },
    },
  },
};

export default config;
