import type { CastingState } from '#shared/domain/casting/casting-state.ts';

const words: Readonly<Record<CastingState, string>> = {
  invested: 'Invested',
  dewaxed: 'Dewaxed',
  'burning-out': 'In burnout',
  holding: 'Holding, ready to pour',
  poured: 'Poured',
  quenched: 'Quenched',
  'broken-out': 'Broken out',
  cut: 'Cut',
  released: 'Release',
  held: 'Hold it',
  scrapped: 'Scrap it',
};

/** What the button says that takes a casting from one state to another. */
export const moveWords = (from: CastingState, to: CastingState): string =>
  from === 'held' && to !== 'scrapped' ? `Back to ${words[to].toLowerCase()}` : words[to];
