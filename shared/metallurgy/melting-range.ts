import { liquidusK, solidusK, solvusK } from './boundaries.ts';
import { ENGINE, type Engine, type Job } from './engine.ts';
import { stateOf } from './equilibrium.ts';
import { ZERO_CELSIUS_K } from './model.ts';
import { ScheilCurve } from './scheil-curve.ts';
import { scheilFreeze } from './scheil-walk.ts';
import type { Composition, MeltingRange, Outcome } from './types.ts';

/** Liquidus and equilibrium solidus of a prepared job, °C. */
export const rangeOf = (job: Job): { readonly liquidusC: number; readonly solidusC: number } => {
  const liquidus = liquidusK(job);
  const solidus = Math.min(liquidus, solidusK(job, liquidus));
  return { liquidusC: liquidus - ZERO_CELSIUS_K, solidusC: solidus - ZERO_CELSIUS_K };
};

const joinNotes = (...notes: readonly (string | null)[]): string | null => {
  const said = notes.filter((note) => note !== null);
  return said.length > 0 ? said.join(' ') : null;
};

/** Where an alloy starts and ends melting, where its last as-cast liquid freezes, and where its solid splits, °C. */
export const meltingRange = (composition: Composition, engine: Engine = ENGINE): Outcome<MeltingRange> => {
  const job = engine.prepare(composition);
  if (!job.withinModel) return job;
  const { liquidusC, solidusC } = rangeOf(job);
  const atSolidus = stateOf(job, solidusC);
  if (!atSolidus.withinModel) return atSolidus;
  const solvus = solvusK(job, solidusC + ZERO_CELSIUS_K);
  const freeze = scheilFreeze(job);
  const asCastSolidusC = new ScheilCurve(job, freeze).endC;
  const lost = asCastSolidusC === null ? `The as-cast limit is not computed: ${freeze.note ?? ''}` : null;
  return {
    withinModel: true,
    liquidusC,
    solidusC,
    asCastSolidusC: asCastSolidusC === null ? null : Math.min(asCastSolidusC, solidusC),
    solvusC: solvus === null ? null : solvus - ZERO_CELSIUS_K,
    note: joinNotes(job.note, lost),
  };
};
