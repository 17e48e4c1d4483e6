import { cardSteps } from '#shared/domain/pour-card/card-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';

/** What the editor at the desk sends to the terminal's preview, by `window.postMessage` within our own origin. */
export type PreviewMessage = WorkInstruction;

/** What the preview posts to the page around it once it listens, so that it is sent what to show. */
export const previewReady = 'preview-ready';

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  value !== null && typeof value === 'object';

/** Whether something that was posted to the preview is an instruction to show. */
export const isPreviewMessage = (data: unknown): data is PreviewMessage => {
  if (!isRecord(data) || !isRecord(data['sentences']) || !Array.isArray(data['steps'])) return false;
  const { sentences } = data;
  const texts = [
    data['title'],
    data['emergencyText'],
    data['deference'],
    ...cardSteps.map((part) => sentences[part]),
  ];
  return texts.every((text) => typeof text === 'string');
};
