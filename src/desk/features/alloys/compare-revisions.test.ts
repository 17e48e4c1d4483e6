import { describe, expect, it } from 'vitest';
import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import { figuresOfComposition } from '#shared/domain/alloy/figures-of-composition.ts';
import { formatTemperature } from '#shared/lib/units.ts';
import { approvedRevision, chooseRevision, openRevision, revisionBefore } from './choose-revision.ts';
import { compareRevisions } from './compare-revisions.ts';

const revisionOf = (number: number, compositionWt: Readonly<Record<string, number>>): AlloyRevision => {
  const outcome = figuresOfComposition(compositionWt, null);
  if (!outcome.ok) throw new Error(outcome.error);
  return {
    ...outcome.value,
    id: `revision-${number}`,
    number,
    status: 'approved',
    compositionWt,
    toleranceWt: {},
    fineness: 925,
    drift: [],
    quench: { earliestS: 900, latestS: null, medium: 'water', why: 'It sets.', source: 'A trial.' },
    measured: null,
    note: '',
    draftedBy: 'Maren',
    checkedBy: null,
    checkedAt: null,
    approvedBy: null,
    approvedAt: null,
    abilities: { check: false, approve: false },
  };
};

const writing = { temperature: (celsius: number) => formatTemperature(celsius, 'C'), unit: 'C' } as const;
const plain = revisionOf(1, { Ag: 92.5, Cu: 7.5 });
const zinced = revisionOf(2, { Ag: 92.5, Cu: 5, Zn: 2.5 });
const changeOf = (before: AlloyRevision, now: AlloyRevision, what: string): string | undefined =>
  compareRevisions(before, now, writing).find((row) => row.what === what)?.change;

describe('compareRevisions', () => {
  it('says in words and with a sign how the composition differs, absent metals included', () => {
    expect(changeOf(plain, zinced, 'Copper, wt%')).toBe('−2.5: less copper');
    expect(changeOf(plain, zinced, 'Zinc, wt%')).toBe('+2.5: more zinc');
    expect(changeOf(plain, zinced, 'Silver, wt%')).toBe('the same');
    expect(changeOf(zinced, plain, 'Zinc, wt%')).toBe('−2.5: less zinc');
  });

  it('gives each temperature its difference, from the figures of both', () => {
    const moved = zinced.figures.solidusC - plain.figures.solidusC;
    const sign = moved < 0 ? '−' : '+';
    expect(changeOf(plain, zinced, 'Solidus')).toBe(
      `${sign}${Math.abs(moved).toFixed(1)} °C: ${moved < 0 ? 'lower' : 'higher'}`,
    );
  });

  it('finds no difference between equal revisions', () => {
    const rows = compareRevisions(plain, { ...plain, number: 2 }, writing);
    expect(rows.filter(({ isChanged }) => isChanged)).toEqual([]);
  });

  it('says when a figure is no longer given', () => {
    const without = { ...plain, figures: { ...plain.figures, asCastSolidusC: null } };
    expect(changeOf(plain, without, 'As-cast limit')).toBe('no longer given');
    expect(changeOf(without, plain, 'As-cast limit')).toBe('given now');
  });

  it('notices a quench rule that has changed', () => {
    const later = { ...plain, quench: { ...plain.quench, latestS: 1200 } };
    expect(changeOf(plain, later, 'Quench')).toBe('changed');
  });

  it('notices tolerances that have changed, in whatever order they were written', () => {
    const [one, other] = [
      { ...plain, toleranceWt: { Ag: 0.3, Cu: 0.3 } },
      { ...plain, toleranceWt: { Cu: 0.3, Ag: 0.3 } },
    ];
    expect(changeOf(one, other, 'Tolerances, wt%')).toBe('the same');
    expect(changeOf(plain, one, 'Tolerances, wt%')).toBe('changed');
  });
});

describe('choosing a revision', () => {
  const draft = { ...zinced, number: 3, id: 'revision-3', status: 'draft' } as const;
  const old = { ...plain, status: 'superseded' } as const;
  const alloy = { revisions: [draft, zinced, old] };

  it('shows the approved one unless the address names another', () => {
    expect(chooseRevision(alloy, null)).toBe(zinced);
    expect(chooseRevision(alloy, '3')).toBe(draft);
    expect(chooseRevision(alloy, '99')).toBe(zinced);
    expect(chooseRevision({ revisions: [draft] }, null)).toBe(draft);
  });

  it('tells the approved one, the one under way and the one before', () => {
    expect(approvedRevision(alloy)).toBe(zinced);
    expect(openRevision(alloy)).toBe(draft);
    expect(revisionBefore(alloy, draft)).toBe(zinced);
    expect(revisionBefore(alloy, old)).toBeUndefined();
  });
});
