import { describe, expect, it } from 'vitest';
import { boundsOfLocalDay } from './local-day.ts';

const hoursOf = (day: string, timeZone: string): number => {
  const { from, to } = boundsOfLocalDay(day, timeZone);
  return (to.getTime() - from.getTime()) / 3_600_000;
};

const startOf = (day: string, timeZone: string): string => boundsOfLocalDay(day, timeZone).from.toISOString();

// Clock changes after the IANA time zone database.
describe('a local day', () => {
  it('begins at local midnight', () => {
    expect(startOf('2026-12-01', 'UTC')).toBe('2026-12-01T00:00:00.000Z');
    expect(startOf('2026-12-01', 'America/New_York')).toBe('2026-12-01T05:00:00.000Z');
    expect(startOf('2026-12-01', 'Pacific/Auckland')).toBe('2026-11-30T11:00:00.000Z');
    expect(startOf('2026-12-01', 'Asia/Kathmandu')).toBe('2026-11-30T18:15:00.000Z');
  });

  it.each([
    ['2026-03-29', 'Europe/Lisbon', 23],
    ['2026-10-25', 'Europe/Lisbon', 25],
    ['2026-03-08', 'America/New_York', 23],
    ['2026-11-01', 'America/New_York', 25],
    ['2026-04-05', 'Australia/Lord_Howe', 24.5],
    ['2026-10-04', 'Australia/Lord_Howe', 23.5],
    ['2026-06-15', 'Europe/Lisbon', 24],
    ['2028-02-29', 'Europe/Lisbon', 24],
  ])('%s in %s has %d hours', (day, timeZone, hours) => {
    expect(hoursOf(day, timeZone)).toBe(hours);
  });

  it('begins an hour late where midnight itself is skipped', () => {
    // Santiago goes from 24:00 on Saturday straight to 01:00.
    expect(startOf('2026-09-06', 'America/Santiago')).toBe('2026-09-06T04:00:00.000Z');
    expect(hoursOf('2026-09-06', 'America/Santiago')).toBe(23);
  });

  it.each([
    'Europe/Lisbon',
    'America/Santiago',
    'America/Sao_Paulo',
    'Pacific/Apia',
    'Africa/Cairo',
    'Asia/Tehran',
  ])('ends where the next begins, all the year in %s', (timeZone) => {
    const days = Array.from({ length: 366 }, (_, index) =>
      new Date(Date.UTC(2026, 0, 1 + index)).toISOString().slice(0, 10),
    );
    for (const [index, day] of days.slice(0, -1).entries()) {
      expect(boundsOfLocalDay(day, timeZone).to.toISOString()).toBe(startOf(days[index + 1] ?? '', timeZone));
    }
  });

  it('is the same wherever the server stands', () => {
    const before = process.env.TZ;
    const starts = ['UTC', 'Pacific/Kiritimati', 'America/Adak'].map((zone) => {
      process.env.TZ = zone;
      return startOf('2026-03-29', 'Europe/Lisbon');
    });
    if (before === undefined) delete process.env.TZ;
    else process.env.TZ = before;
    expect(new Set(starts)).toEqual(new Set(['2026-03-29T00:00:00.000Z']));
  });
});
