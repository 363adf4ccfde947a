import type { Config } from 'tailwindcss';

/** Every colour is a variable, so that low light is one set of values and not a second set of classes. */
const named = (names: readonly string[]): Record<string, string> => Object.fromEntries(names.map((name) => [name, `var(--${name})`]));

export default {
  content: ['./app/**/*.tsx', './components/**/*.tsx', './features/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: named([
        'ground', 'panel', 'raised', 'line', 'line-strong', 'ink', 'on-ink', 'soft', 'quiet', 'night', 'on-night', 'quiet-on-night', 'line-on-night',
        'hot', 'hot-text', 'hot-tint', 'calm', 'calm-text', 'calm-tint', 'look', 'look-text', 'look-tint', 'paper', 'paper-ink', 'paper-quiet', 'paper-edge', 'paper-look', 'veil',
      ]),
      fontFamily: { sans: 'var(--sans)', mono: 'var(--mono)' },
    },
  },
} satisfies Config;
