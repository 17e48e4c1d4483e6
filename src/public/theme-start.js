// Runs before the first paint, so that a terminal in a dark melt room never flashes white. Mirrors src/lib/theme.ts.
let chosen = null;
try {
  chosen = globalThis.localStorage.getItem('ladlemark.theme');
} catch {
  // Storage may be blocked; the system's preference then decides.
}
const dark = globalThis.matchMedia('(prefers-color-scheme: dark)').matches;
globalThis.document.documentElement.classList.toggle(
  'melt-room',
  chosen === 'melt-room' || (chosen !== 'day' && dark),
);
