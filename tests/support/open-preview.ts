import type { Page } from 'playwright-core';
import { previewReady, type PreviewMessage } from '#src/lib/preview-message.ts';

/** Opens the terminal's preview from a page of our own origin and hands it an instruction, as the desk does. */
export const openPreview = async (page: Page, message: PreviewMessage): Promise<Page> => {
  const opening = page.waitForEvent('popup');
  await page.evaluate(
    ({ message, previewReady }) => {
      const preview = window.open('/kiosk/preview');
      window.addEventListener('message', ({ data, source }) => {
        if (source === preview && data === previewReady)
          preview?.postMessage(message, window.location.origin);
      });
    },
    { message, previewReady },
  );
  return opening;
};
