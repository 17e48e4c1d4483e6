import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';

/** What stands on the pour step. */
export interface PourWords {
  readonly sentence: string;
  readonly sub: string;
}

/** What to do while the flask is out, and once its window has passed; temperatures in °C. */
export const pourWords = (
  { isPast, flaskC, lowC, sentence }: { isPast: boolean; flaskC: number; lowC: number; sentence: string },
  write: UnitWriter,
): PourWords =>
  isPast
    ? {
        sentence: 'The window has passed: the flask is too cold.',
        sub: `About ${write.temperature(flaskC)} now; the card allows no colder than ${write.temperature(lowC)}. Do not pour. Put the flask back, press stop work, and end the card. If it is poured already, hold the button: it is marked as late.`,
      }
    : {
        sentence,
        sub: `Flask about ${write.temperature(flaskC)}, no colder than ${write.temperature(lowC)}.`,
      };
