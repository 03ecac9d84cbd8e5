import type { Config } from 'tailwindcss';

/** The tokens' values live in app/globals.css, once for day and once for night. */
export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  darkMode: ['class', '[data-theme="night"]'],
  theme: {
    extend: {
      colors: {
        ground: 'var(--ground)',
        panel: 'var(--panel)',
        ink: 'var(--ink)',
        muted: 'var(--muted)',
        line: 'var(--line)',
        spruce: 'var(--spruce)',
        'on-spruce': 'var(--on-spruce)',
        within: 'var(--within)',
        thin: 'var(--thin)',
        beyond: 'var(--beyond)',
        unknown: 'var(--unknown)',
      },
      fontFamily: { sans: ['"Noto Sans"', 'sans-serif'] },
    },
  },
} satisfies Config;
