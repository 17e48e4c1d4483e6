import { instructionContent, type Instruction } from '#shared/contracts/instruction.ts';
import { judgeInstruction } from '#shared/domain/instruction/judge-instruction.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import type { CardStep } from '#shared/domain/pour-card/card-step.ts';
import type { Units } from '#shared/lib/units.ts';
import { readStep, valuesOfStep, type StepValues } from './step-values.ts';

/** A draft as it is typed. */
export interface InstructionValues {
  readonly title: string;
  readonly note: string;
  readonly sentences: Record<CardStep, string>;
  readonly steps: StepValues[];
  readonly emergencyText: string;
  readonly deference: string;
}

/** A draft as its fields show it, limits in the studio's units. */
export const valuesOf = ({ content, note }: Instruction, units: Units): InstructionValues => ({
  title: content.title,
  note,
  sentences: { ...content.sentences },
  steps: content.steps.map((step) => valuesOfStep(step, units)),
  emergencyText: content.emergencyText,
  deference: content.deference,
});

/** What was typed, as it would be stored, with what is wrong with it. */
export interface ReadInstruction {
  readonly content: WorkInstruction;
  /** What keeps it from being stored, by the path of its field. */
  readonly fieldFaults: ReadonlyMap<string, string>;
  /** What keeps it from being approved, by the key of its step; '' for the instruction as a whole. */
  readonly stepFaults: ReadonlyMap<string, readonly string[]>;
}

/** The field at which a fault of the stored form is shown. */
const fieldOf = (path: string): string => path.replace(/\.(limitsG|limitsC|when)\./, '.');

const judged = (content: WorkInstruction): Map<string, string[]> => {
  const byStep = new Map<string, string[]>();
  for (const { stepKey, sentence } of judgeInstruction(content))
    byStep.set(stepKey ?? '', [...(byStep.get(stepKey ?? '') ?? []), sentence]);
  return byStep;
};

/** Reads a draft from its fields, and judges it as the server will. */
export const readInstruction = (
  { title, sentences, steps, emergencyText, deference }: InstructionValues,
  units: Units,
): ReadInstruction => {
  const read = steps.map((step) => readStep(step, units));
  const content = { title, sentences, steps: read.map(({ step }) => step), emergencyText, deference };
  const fieldFaults = new Map<string, string>();
  const note = (field: string, message: string): void => {
    if (!fieldFaults.has(field)) fieldFaults.set(field, message);
  };
  read.forEach(({ faults }, index) =>
    faults.forEach(({ field, message }) => note(`steps.${index}.${field}`, message)),
  );
  for (const { path, message } of instructionContent.safeParse(content).error?.issues ?? [])
    note(fieldOf(path.join('.')), message);
  return { content, fieldFaults, stepFaults: judged(content) };
};

/** The faults of one step's fields, by field. */
export const faultsOfFields = (
  { fieldFaults }: Pick<ReadInstruction, 'fieldFaults'>,
  index: number,
): ReadonlyMap<string, string> => {
  const start = `steps.${index}.`;
  return new Map(
    [...fieldFaults].flatMap(([path, message]) =>
      path.startsWith(start) ? [[path.slice(start.length), message] as const] : [],
    ),
  );
};
