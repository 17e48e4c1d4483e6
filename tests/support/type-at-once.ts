import type { Page } from 'playwright-core';

/**
 * Types text and Enter as fast as a scanner or a balance does. The keys are pressed in the page itself: on a busy machine
 * they would otherwise arrive as slowly as a person's.
 */
export const typeAtOnce = (page: Page, text: string): Promise<void> =>
  page.evaluate(
    (keys) => {
      for (const key of keys) {
        const target = document.activeElement ?? document.body;
        target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
      }
    },
    [...text, 'Enter'],
  );
