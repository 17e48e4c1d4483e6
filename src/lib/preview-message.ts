import type { AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import type { CastingMethod } from '#shared/domain/casting/casting-method.ts';
import type { Hazard, WorkerRole } from '#shared/domain/instruction/instruction-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { cardSteps } from '#shared/domain/pour-card/card-step.ts';

/** For which work an instruction is shown; what is left out is a caster's vacuum-assisted pour of yellow gold without hazards. */
export interface PreviewWork {
  readonly method: CastingMethod;
  readonly family: AlloyFamily;
  readonly role: WorkerRole;
  readonly hazards: readonly Hazard[];
}

/**
 * What the editor at the desk sends to the terminal's preview (`/kiosk/preview`) by `window.postMessage` within our own
 * origin: an instruction, beside which may stand for which work it is shown. A further message begins the walk anew.
 */
export type PreviewMessage = WorkInstruction & Partial<PreviewWork>;

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
