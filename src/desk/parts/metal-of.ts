import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';

/** The precious metal whose colours an alloy is drawn in: warm for gold, cool for silver. */
export const metalOf = (family: AlloyFamily): 'gold' | 'silver' => (family === 'silver' ? 'silver' : 'gold');
