import { describe, expect, it } from 'vitest';
import { defaultSteps } from './default-steps.ts';
import { belongsToWork, hazardsOf, stepsBefore, type Work } from './step-applies.ts';

const keysFor = (work: Work, role: 'caster' | 'apprentice'): readonly string[] => {
  const steps = defaultSteps.filter((step) => belongsToWork(step, work));
  return (['guard', 'charge', 'melt', 'flask-out', 'pour', 'quench', 'close'] as const).flatMap((part) =>
    stepsBefore(steps, part, role).map(({ key }) => key),
  );
};

describe('the shipped steps', () => {
  const sterling: Work = { method: 'vacuum', family: 'silver', hazards: [] };

  it('ask of a caster only what the work wants', () => {
    const keys = keysFor(sterling, 'caster');
    expect(keys).toEqual(expect.arrayContaining(['silver-cover', 'vacuum-ready']));
    for (const other of ['nickel', 'palladium-mould', 'arm-locked', 'apprentice-pour', 'zinc'])
      expect(keys).not.toContain(other);
  });

  it('caution an apprentice before each hot part, and ask for a sign before the pour', () => {
    const keys = keysFor(sterling, 'apprentice');
    expect(keys).toEqual(
      expect.arrayContaining(['apprentice-face', 'apprentice-hands', 'apprentice-pour', 'apprentice-steam']),
    );
  });

  it('caution for nickel and palladium in white gold, and lock the arm of a centrifuge', () => {
    const hazards = hazardsOf({ Au: 75, Ni: 11.5, Cu: 8.5, Zn: 5 });
    expect(hazards).toEqual(['nickel', 'zinc']);
    const nickel = keysFor({ method: 'centrifugal', family: 'white-gold', hazards }, 'caster');
    expect(nickel).toEqual(expect.arrayContaining(['nickel', 'zinc', 'nickel-mould', 'arm-locked']));
    const palladium = {
      method: 'vacuum',
      family: 'white-gold',
      hazards: hazardsOf({ Au: 75, Pd: 15, Ag: 10 }),
    } as const;
    expect(keysFor(palladium, 'caster')).toContain('palladium-mould');
  });
});
