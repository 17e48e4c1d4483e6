import { describe, expect, it } from 'vitest';
import { eventWords, recordedLateS } from './event-words.ts';

const metric = { temperature: 'C', mass: 'g' } as const;

describe('eventWords', () => {
  it('writes masses and temperatures in the studio’s units', () => {
    expect(eventWords({ type: 'charge-weighed', kind: 'returns', massG: 31.103 }, metric)).toBe(
      '31.10 g of returns weighed in.',
    );
    expect(
      eventWords(
        { type: 'charge-weighed', kind: 'grain', massG: 31.1034768 },
        { temperature: 'F', mass: 'ozt' },
      ),
    ).toBe('1.0000 ozt of grain weighed in.');
    expect(
      eventWords(
        { type: 'reading-taken', temperatureC: 100, confirmed: true },
        { temperature: 'F', mass: 'g' },
      ),
    ).toBe('Melt read at 212 °F, questioned and confirmed.');
  });

  it('says when the furnace’s display was not read', () => {
    expect(eventWords({ type: 'flask-out', furnaceC: null }, metric)).toMatch(/not read/);
    expect(eventWords({ type: 'flask-out', furnaceC: 545 }, metric)).toBe(
      'Flask out of the furnace at 545 °C.',
    );
  });

  it('tells button, loss, look and note of a closing', () => {
    const closed = { type: 'closed', buttonMassG: 8.14, lossMassG: 0.148, look: 'misrun' } as const;
    expect(eventWords({ ...closed, note: 'Tongs slipped.' }, metric)).toBe(
      'Card closed: button 8.14 g, loss 0.15 g, the casting is misrun. “Tongs slipped.”',
    );
    expect(eventWords({ ...closed, note: '' }, metric)).not.toContain('“');
  });
});

describe('recordedLateS', () => {
  it('speaks only of more than five seconds', () => {
    expect(recordedLateS('2026-12-01T10:00:00Z', '2026-12-01T10:00:05Z')).toBeNull();
    expect(recordedLateS('2026-12-01T10:00:00Z', '2026-12-01T10:00:41Z')).toBe(41);
  });
});
