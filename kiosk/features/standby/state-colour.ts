import type { CastingState } from '#shared/domain/casting/casting-state.ts';

/** About how hot a flask in each state is, °C, to colour its picture only: common practice, no source; null when nobody can say. */
const about: Readonly<Partial<Record<CastingState, number>>> = {
  invested: 20,
  dewaxed: 150,
  'burning-out': 720,
  holding: 550,
};

/** The temperature that colours a flask's picture by its state; never shown as a figure. */
export const colourTemperatureOf = (state: CastingState): number | null => about[state] ?? null;
