import { type Browser, chromium } from 'playwright-core';
import { findProgram } from '#server/services/process/find-program.ts';

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** The path of an installed Chromium, or null. */
export const findChromium = (): string | null => findProgram(['chromium', 'chromium-browser']);

/** Starts Debian's Chromium; `fakeVideo` (a .y4m or .mjpeg file) becomes what its camera sees, without a question. */
export const launchChromium = ({ fakeVideo }: { readonly fakeVideo?: string } = {}): Promise<Browser> => {
  const executablePath = findChromium();
  if (executablePath === null) {
    throw new Error(
      'Chromium is not installed. Type "sudo apt-get install chromium" and run the tests again.',
    );
  }
  const camera = fakeVideo
    ? [
        '--use-fake-ui-for-media-stream',
        '--use-fake-device-for-media-stream',
        `--use-file-for-fake-video-capture=${fakeVideo}`,
      ]
    : [];
  return chromium.launch({ executablePath, args: [...FLAGS, ...camera] });
};
