import { describe, expect, it } from 'vitest';
import type { DeskSession } from '../parts/desk-session.ts';
import { offeredGroups, placeAt } from './site-places.ts';

const session = (roles: DeskSession['person']['roles'], mayManage: boolean): DeskSession => ({
  person: { id: 'p', name: 'Someone', roles },
  terminal: null,
  via: 'desk',
  studio: {
    name: 'Studio',
    units: { temperature: 'C', mass: 'g' },
    idleLockS: 300,
    timeZone: 'UTC',
    marksPlace: 'ISO 9202',
  },
  abilities: {
    seeDesk: true,
    managePeople: mayManage,
    manageTerminals: mayManage,
    manageAlloys: mayManage,
    editStudio: mayManage,
    runCards: false,
  },
  serverTime: '2026-12-01T10:00:00Z',
});

const offered = (of: DeskSession): Readonly<Record<string, readonly string[]>> =>
  Object.fromEntries(offeredGroups(of).map(({ name, places }) => [name, places.map((place) => place.name)]));

describe('the places of the desk', () => {
  it('are all the owner’s', () => {
    expect(Object.keys(offered(session(['owner'], true)))).toEqual(['Casting', 'Metal', 'Studio']);
  });

  it('leave out what a person may not open', () => {
    expect(offered(session(['caster'], false))['Metal']).not.toContain('Month');
    expect(offered(session(['jeweller'], false))).toEqual({
      Casting: ['Today', 'Melt book', 'Flasks'],
      Metal: ['Alloys'],
      Studio: ['Instructions'],
    });
  });
});

describe('placeAt', () => {
  it.each([
    ['/', 'Today'],
    ['/melts/7', 'Melt book'],
    ['/metal', 'Lots'],
    ['/metal/lots/7', 'Lots'],
    ['/metal/plan', 'Plan a charge'],
    ['/people/new', 'People'],
  ])('finds where %s belongs', (path, name) => {
    expect(placeAt(path)?.name).toBe(name);
  });

  it('names none for an address it does not know', () => {
    expect(placeAt('/nowhere')).toBeUndefined();
  });
});
