import { describe, expect, it } from 'vitest';
import { buildCardContext } from '#shared/domain/pour-card/build-card-context.fixture.ts';
import { unitWriter } from '#kiosk/lib/unit-writer.ts';
import { chargeWords } from './charge-words.ts';
import { meltWords } from './melt-words.ts';
import { pourWords } from './pour-words.ts';
import { quenchSentence } from './quench-sentence.ts';

const context = buildCardContext();
const write = unitWriter({ temperature: 'C', mass: 'g' });
const charge = (grain: number, returns: number) =>
  chargeWords({ charge: { grain, returns } }, context, write);
const plain = (text: string): string => text.replace(/\s/g, ' ');

describe('chargeWords', () => {
  it('counts down to the planned metal and says what the melt waits for', () => {
    const words = charge(60, 20);
    expect(plain(words.mass)).toBe('4.20 g');
    expect(words.state).toBe('wait');
    expect(plain(words.blocked ?? '')).toBe('Melt opens at 82.52 g to 85.88 g');
  });

  it('opens within the tolerance, and tells too much and too many returns apart', () => {
    expect(charge(50, 34.2)).toMatchObject({ state: 'ready', blocked: null });
    expect(plain(charge(70, 20).mass)).toBe('5.80 g');
    expect(charge(70, 20).stateWords).toContain('Too much');
    expect(charge(20, 64).stateWords).toContain('Too many returns');
  });
});

describe('meltWords', () => {
  const { figures } = context;
  const at = (celsius: number, solid: number | null = null) => meltWords(celsius, figures, solid, write);

  it('waits while anything is solid, and names the share only where it is known', () => {
    expect(plain(at(890, 0.51).stateWords)).toBe('Wait. 51 % still solid');
    expect(at(890, null).stateWords).toBe('Wait. Partly solid');
    expect(at(800, 1).sentence).toContain('all solid');
  });

  it('opens in the window and says what it waits for outside', () => {
    expect(at(figures.pourC.low - 1).blocked).toContain('opens at');
    expect(at(figures.pourC.low)).toMatchObject({ state: 'ready', blocked: null });
    expect(at(figures.pourC.high)).toMatchObject({ state: 'ready', blocked: null });
    expect(at(figures.pourC.high + 1)).toMatchObject({ state: 'caution' });
    expect(at(figures.pourC.high + 1).blocked).toContain('below');
  });

  it('writes in the studio’s unit', () => {
    const words = meltWords(figures.pourC.low, figures, null, unitWriter({ temperature: 'F', mass: 'g' }));
    expect(words.stateWords).toContain('°F');
  });
});

describe('pourWords', () => {
  const mould = { flaskC: 512, lowC: 515, sentence: 'Flask is out. Pour now.' };

  it('says plainly when the window has passed, and what to do', () => {
    const words = pourWords({ ...mould, isPast: true }, write);
    expect(words.sentence).toContain('window has passed');
    expect(words.sub).toContain('Do not pour');
  });

  it('keeps the instruction’s own sentence before', () => {
    expect(pourWords({ ...mould, isPast: false }, write).sentence).toBe(mould.sentence);
  });
});

describe('quenchSentence', () => {
  const rule = { medium: 'warm water', latestS: 300 } as const;

  it('waits, then presses where the alloy has a latest moment, then says it is late', () => {
    expect(quenchSentence({ state: 'wait' }, rule, 'Let it stand.')).toBe('Let it stand.');
    expect(quenchSentence({ state: 'ready' }, rule, '')).toBe('Quench it in warm water now. Not later.');
    expect(quenchSentence({ state: 'caution' }, rule, '')).toContain('It is late');
    expect(quenchSentence({ state: 'ready' }, { medium: 'air', latestS: null }, '')).toBe(
      'Let it cool in air now.',
    );
  });
});
