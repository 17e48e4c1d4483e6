import { describe, expect, it } from 'vitest';
import type { Studio } from '#shared/contracts/studio.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import { requestOf, studioForm, valuesOf, type StudioValues } from './studio-values.ts';

const studio: Studio = {
  version: 3,
  name: 'Emberhythe Castings',
  temperatureUnit: 'C',
  massUnit: 'g',
  timeZone: 'Europe/Lisbon',
  idleLockS: 180,
  processTables: defaultProcessTables,
  limits: defaultStudioLimits,
  marksPlace: 'ISO 9202',
  pyrometerCheckDays: 30,
  abilities: { update: true },
};

const changed = (change: Partial<StudioValues>): StudioValues => ({ ...valuesOf(studio), ...change });

const faultsOf = (values: StudioValues) =>
  (studioForm.safeParse(values).error?.issues ?? []).map(({ path }) => path.join('.'));

describe('the form of the settings', () => {
  it('sends back exactly what it was given when nothing is touched', () => {
    const { abilities: _, ...settings } = studio;
    expect(requestOf(valuesOf(studio))).toEqual(settings);
    expect(studioForm.parse(valuesOf(studio))).toEqual(settings);
  });

  it('shows shares in per cent and cooling rates per minute', () => {
    const { limits, processTables } = valuesOf(studio);
    expect(limits.lossShare).toBe('0.5');
    expect(limits.returnsShare).toBe('50');
    expect(limits.chargeTolerance).toBe('2');
    expect(limits.furnaceMaxC).toBe('1400');
    expect(processTables.buttonShare).toBe('10');
    expect(processTables.flaskCooling[0]).toEqual({ diameterMm: '64', perSecond: '0.0756' });
  });

  it('reads a decimal comma', () => {
    const values = valuesOf(studio);
    const read = studioForm.parse({ ...values, limits: { ...values.limits, lossShare: '0,75' } });
    expect(read.limits.lossShare).toBe(0.0075);
  });

  it('names the very field that is no number, or out of order', () => {
    const { processTables } = valuesOf(studio);
    const vacuum = { ...processTables.superheat.vacuum, thin: { low: '93', high: 'hot' } };
    const superheat = { ...processTables.superheat, vacuum };
    expect(faultsOf(changed({ processTables: { ...processTables, superheat } }))).toEqual([
      'processTables.superheat.vacuum.thin.high',
    ]);
    const reversed = {
      ...processTables.superheat,
      vacuum: { ...processTables.superheat.vacuum, thin: { low: '111', high: '93' } },
    };
    expect(faultsOf(changed({ processTables: { ...processTables, superheat: reversed } }))).toEqual([
      'processTables.superheat.vacuum.thin.high',
    ]);
  });

  it('wants a name, a time zone there is, and whole seconds', () => {
    expect(faultsOf(changed({ name: ' ', timeZone: 'Nowhere/Land', idleLockS: '60,5' }))).toEqual([
      'name',
      'timeZone',
      'idleLockS',
    ]);
  });
});
