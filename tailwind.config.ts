import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

/**
 * Design tokens. Colours are CSS variables so that one class serves both themes:
 * *day* (plaster ground) and *melt room* (lights down, nothing that glares); the values live in `themes` below.
 * Text tokens on `ground` and `panel` hold a contrast of 7:1 or better; `-fill` tokens are for shapes, never for text.
 */
export const themes = {
  day: {
    ground: '#F6F2EA',
    panel: '#FFFDF8',
    line: '#D8CFBF',
    ink: '#211E1B',
    soft: '#575048',
    ember: '#932D09',
    'ember-soft': '#F3D9CB',
    'on-ember': '#FFF8F2',
    iron: '#27465A',
    'iron-soft': '#D5E0E6',
    brass: '#5E430A',
    'brass-soft': '#F0E2BE',
    silver: '#404B53',
    'silver-soft': '#E2E6E8',
    ok: '#22543D',
    'ember-fill': '#BF4412',
    'brass-fill': '#B8892B',
    'silver-fill': '#76848E',
  },
  room: {
    ground: '#14110E',
    panel: '#1E1915',
    line: '#3D342B',
    ink: '#F0E4D3',
    soft: '#BCAE9B',
    ember: '#FF9457',
    'ember-soft': '#43210F',
    'on-ember': '#1A0C04',
    iron: '#9CC1D6',
    'iron-soft': '#1D2D37',
    brass: '#E3BD64',
    'brass-soft': '#392B0D',
    silver: '#B9C3C9',
    'silver-soft': '#262B2E',
    ok: '#8FD3AE',
    'ember-fill': '#FF9457',
    'brass-fill': '#E3BD64',
    'silver-fill': '#B9C3C9',
  },
} as const;

/** Names of the colour tokens, the same in both themes. */
export type ColourToken = keyof (typeof themes)['day'];

const variables = (theme: Readonly<Record<ColourToken, string>>): Record<string, string> =>
  Object.fromEntries(Object.entries(theme).map(([token, value]) => [`--${token}`, value]));

const colours = Object.fromEntries(Object.keys(themes.day).map((token) => [token, `var(--${token})`]));

export default {
  theme: {
    colors: { transparent: 'transparent', current: 'currentColor', ...colours },
    fontFamily: { sans: ['Nunito', 'sans-serif'] },
  },
  plugins: [
    plugin((api) => api.addBase({ ':root': variables(themes.day), '.melt-room': variables(themes.room) })),
  ],
} satisfies Config;
