import { z } from 'zod';
import { alloyFamilies } from '#shared/domain/alloy/alloy-family.ts';
import { castingMethods } from '#shared/domain/casting/casting-method.ts';
import {
  hazards,
  safetySigns,
  workerRoles,
  type InstructionStep,
  type StepConditions,
} from '#shared/domain/instruction/instruction-step.ts';
import type { InstructionFault } from '#shared/domain/instruction/judge-instruction.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { cardSteps } from '#shared/domain/pour-card/card-step.ts';
import { massOrNoneG, optionalWords, temperatureC, words, type Abilities } from './common.ts';

/** The most steps that one instruction may have. */
export const maxSteps = 60;

const listOf = <Value extends string>(values: readonly Value[]) =>
  z
    .array(z.enum(values))
    .max(values.length)
    .refine((list) => new Set(list).size === list.length, 'Each of them counts once.');

const conditions = z.object({
  methods: listOf(castingMethods),
  families: listOf(alloyFamilies),
  roles: listOf(workerRoles),
  hazards: listOf(hazards),
}) satisfies z.ZodType<StepConditions>;

const base = {
  key: z
    .string()
    .max(60)
    .regex(/^[a-z0-9][a-z0-9-]*$/, 'A step’s mark is written in small letters, digits and dashes.'),
  before: z.enum(cardSteps),
  sentence: words(200, 'Say what to do.'),
  when: conditions,
  maySkip: z.boolean(),
};

const option = z.object({ words: words(60, 'Give the answer its words.'), isVariance: z.boolean() });

const step = z.discriminatedUnion('kind', [
  z.object({ ...base, kind: z.literal('say') }),
  z.object({ ...base, kind: z.literal('check'), sign: z.enum(safetySigns).nullable() }),
  z.object({
    ...base,
    kind: z.literal('weigh'),
    limitsG: z.object({ low: massOrNoneG.nullable(), high: massOrNoneG.nullable() }),
  }),
  z.object({
    ...base,
    kind: z.literal('read'),
    limitsC: z.object({ low: temperatureC.nullable(), high: temperatureC.nullable() }),
  }),
  z.object({
    ...base,
    kind: z.literal('wait'),
    seconds: z
      .int('Give whole seconds.')
      .min(1, 'Wait at least a second.')
      .max(14_400, 'Wait at most four hours.'),
  }),
  z.object({ ...base, kind: z.literal('photograph') }),
  z.object({ ...base, kind: z.literal('scan') }),
  z.object({ ...base, kind: z.literal('choose'), options: z.array(option).max(8, 'At most eight answers.') }),
  z.object({ ...base, kind: z.literal('countersign') }),
  z.object({ ...base, kind: z.literal('hold-to-act'), act: words(40, 'Name what is done.') }),
]) satisfies z.ZodType<InstructionStep>;

const steps = z
  .array(step)
  .max(maxSteps, `An instruction has at most ${maxSteps} steps.`)
  .superRefine((list, context) => {
    const keys = list.map(({ key }) => key);
    list.forEach(({ key }, index) => {
      if (keys.indexOf(key) !== index)
        context.addIssue({ code: 'custom', path: [index, 'key'], message: 'Two steps bear the same mark.' });
    });
  });

/** A work instruction as it is written; whether it may be approved is judged apart. */
export const instructionContent = z.object({
  title: words(80, 'Give the instruction a title.'),
  sentences: z.record(z.enum(cardSteps), words(120, 'Say in one sentence what this part asks for.')),
  steps,
  emergencyText: words(600, 'Say what to do when work is stopped.'),
  deference: words(300, 'Say who comes before this instruction.'),
}) satisfies z.ZodType<WorkInstruction>;

/** Where a revision of the work instruction stands; only an approved one is worked by. */
export type InstructionStatus = 'draft' | 'approved' | 'dropped';

const version = z.int().positive();

/** Drafts a new revision that begins as another one stands. */
export const draftInstructionRequest = z.object({ from: z.uuid('Choose what the draft begins from.') });
/** Drafts a new revision. */
export type DraftInstructionRequest = z.input<typeof draftInstructionRequest>;

/** Changes a draft; `version` is the one that was read, so that two people never overwrite one another. */
export const changeInstructionRequest = z.object({
  version,
  content: instructionContent,
  note: optionalWords(1000),
});
/** Changes a draft. */
export type ChangeInstructionRequest = z.input<typeof changeInstructionRequest>;

/** Drops a draft: it stays in the list and nobody works by it. */
export const dropInstructionRequest = z.object({ version });
/** Drops a draft. */
export type DropInstructionRequest = z.input<typeof dropInstructionRequest>;

/** Approves a draft as it was read; `exception` says why nobody else looked, in a studio of one. */
export const approveInstructionRequest = z.object({ version, exception: optionalWords(500) });
/** Approves a draft. */
export type ApproveInstructionRequest = z.input<typeof approveInstructionRequest>;

/** How the person who asks may approve: as a second person, by an exception, or not at all because they drafted it. */
export type ApprovalRule = 'second-person' | 'exception' | 'own-draft';

/** A revision of the work instruction as the list shows it. */
export interface InstructionSummary {
  readonly id: string;
  readonly number: number;
  readonly status: InstructionStatus;
  /** Whether cards that are opened now are worked by it. */
  readonly isInForce: boolean;
  readonly title: string;
  readonly note: string;
  readonly exception: string;
  /** Null for the one that the studio began with. */
  readonly draftedBy: string | null;
  readonly draftedAt: string;
  readonly approvedBy: string | null;
  readonly approvedAt: string | null;
}

/** One revision of the work instruction. */
export interface Instruction extends InstructionSummary {
  readonly version: number;
  readonly content: WorkInstruction;
  /** What keeps it from being approved. */
  readonly faults: readonly InstructionFault[];
  readonly approval: ApprovalRule;
  readonly abilities: Abilities<'draft' | 'change' | 'drop' | 'approve'>;
}

/** Every revision, newest first, and whether the person who asks may draft another. */
export interface InstructionList {
  readonly revisions: readonly InstructionSummary[];
  readonly abilities: Abilities<'draft'>;
}
