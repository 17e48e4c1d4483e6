import { describe, expect, it } from 'vitest';
import { bannerLines } from './banner.ts';

const demo = {
  signIns: [
    { role: 'owner', name: 'Ada Fell', login: 'ada', password: 'three words', pin: '123456' },
    { role: 'caster', name: 'Bo', login: 'bo', password: 'pw', pin: '654321' },
  ],
  enrolmentCode: 'ABCD-1234',
};

describe('bannerLines', () => {
  it('gives the addresses of the desk and the terminal on this machine', () => {
    const lines = bannerLines('127.0.0.1', 4380, null);
    expect(lines).toContain('  desk      http://localhost:4380/');
    expect(lines).toContain('  terminal  http://localhost:4380/kiosk');
    expect(lines.join('\n')).not.toMatch(/PIN|Demo/);
  });

  it('lists every demo sign-in in aligned columns, and the enrolment code', () => {
    const lines = bannerLines('127.0.0.1', 4380, demo);
    const [head, owner, caster] = lines.slice(lines.findIndex((line) => line.startsWith('  role')));
    expect(head).toBe('  role    name      login  password     PIN');
    expect(owner).toBe('  owner   Ada Fell  ada    three words  123456');
    expect(caster).toBe('  caster  Bo        bo     pw           654321');
    expect(lines.join('\n')).toContain('ABCD-1234');
    expect(lines.join('\n')).not.toContain('Everyone on this network');
    expect(bannerLines('127.0.0.1', 4380, { ...demo, enrolmentCode: null }).join('\n')).not.toContain('code');
  });

  it('warns of known sign-ins when others on the network can reach them', () => {
    expect(bannerLines('0.0.0.0', 4380, demo).join('\n')).toContain('Everyone on this network');
    expect(bannerLines('::1', 4380, demo).join('\n')).toContain('http://[::1]:4380/kiosk');
  });
});
