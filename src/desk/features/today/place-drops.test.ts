import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeDrops, type Hangable } from './place-drops.ts';

const minutes = (ms: number): number => ms / 60_000;

const casting = (id: string, minute: number, bay = 'bay 1'): Hangable => ({
  id,
  bay,
  plannedPourAt: new Date(minute * 60_000).toISOString(),
});

describe('placeDrops', () => {
  it('hangs drops at their times, earliest first', () => {
    const [bay] = placeDrops([casting('late', 300), casting('early', 100)], minutes, 60);
    expect(bay?.drops.map(({ item, x, level }) => [item.id, x, level])).toEqual([
      ['early', 100, 0],
      ['late', 300, 0],
    ]);
    expect(bay?.levels).toBe(1);
  });

  it('hangs lower what would overlap, and comes up again where there is room', () => {
    const [bay] = placeDrops(
      [0, 20, 40, 60, 80].map((at) => casting(String(at), at)),
      minutes,
      50,
    );
    expect(bay?.drops.map(({ level }) => level)).toEqual([0, 1, 2, 0, 1]);
    expect(bay?.levels).toBe(3);
  });

  it('keeps bays apart, tenth after second', () => {
    const bays = placeDrops(
      [casting('a', 0, 'bay 10'), casting('b', 0, 'bay 2'), casting('c', 0, 'bay 2')],
      minutes,
      50,
    );
    expect(bays.map(({ bay, drops }) => [bay, drops.length])).toEqual([
      ['bay 2', 2],
      ['bay 10', 1],
    ]);
  });

  it('never lets two drops of a bay overlap', () => {
    const many = fc.array(fc.integer({ min: 0, max: 1440 }), { maxLength: 40 });
    fc.assert(
      fc.property(many, (at) => {
        const [bay] = placeDrops(
          at.map((minute, index) => casting(String(index), minute)),
          minutes,
          30,
        );
        const drops = bay?.drops ?? [];
        return drops.every((a, i) =>
          drops.slice(i + 1).every((b) => a.level !== b.level || Math.abs(a.x - b.x) >= 30),
        );
      }),
    );
  });
});
