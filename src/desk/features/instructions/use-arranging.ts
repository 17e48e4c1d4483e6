import { useEffect, useRef, useState } from 'react';
import type { StepKind } from '#shared/domain/instruction/instruction-step.ts';
import { cardStepNames, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { addStep, duplicateStep, moveStep, putBack, removeStep, takeToPart } from './arrange-steps.ts';
import { emptyStep, type StepValues } from './step-values.ts';

interface Removed {
  readonly step: StepValues;
  readonly index: number;
}

/** What may be done with the steps of a draft. */
export interface Arranging {
  /** The key of the step whose fields are open. */
  readonly openKey: string | null;
  /** The step that was removed last, until something else is put in its place. */
  readonly removed: Removed | null;
  /** What was just done, for those who do not see it. */
  readonly said: string;
  readonly toggle: (key: string) => void;
  readonly add: (kind: StepKind, before: CardStep) => void;
  readonly change: (index: number, change: Partial<StepValues>) => void;
  readonly move: (index: number, way: 'up' | 'down') => void;
  readonly takeToPart: (index: number, part: CardStep) => void;
  readonly duplicate: (index: number) => void;
  readonly remove: (index: number) => void;
  readonly undoRemove: () => void;
}

/** Arranges steps, and keeps the focus on the one that was touched: moving one to another part makes its row anew. */
export const useArranging = (
  steps: readonly StepValues[],
  store: (steps: StepValues[]) => void,
): Arranging => {
  const [openKey, setOpenKey] = useState<string | null>(null);
  const [removed, setRemoved] = useState<Removed | null>(null);
  const [said, setSaid] = useState('');
  const focusNext = useRef<string | null>(null);
  useEffect(() => {
    if (focusNext.current) document.getElementById(focusNext.current)?.focus();
    focusNext.current = null;
  }, [steps]);

  const placed = (next: StepValues[], key: string, control: string | null): void => {
    focusNext.current = control;
    const step = next.find((each) => each.key === key);
    if (step) setSaid(`Now step ${next.indexOf(step) + 1}, before ${cardStepNames[step.before]}.`);
    store(next);
  };
  return {
    openKey,
    removed,
    said,
    toggle: (key) => setOpenKey((open) => (open === key ? null : key)),
    add: (kind, before) => {
      const step = emptyStep(kind, before);
      setOpenKey(step.key);
      // Its sentence takes the focus by itself.
      placed(addStep(steps, step), step.key, null);
    },
    change: (index, change) => {
      const step = steps[index];
      if (step) store(steps.with(index, { ...step, ...change }));
    },
    move: (index, way) => {
      const step = steps[index];
      const next = moveStep(steps, index, way);
      if (step && next) placed(next, step.key, `${way}-${step.key}`);
    },
    takeToPart: (index, part) => {
      const step = steps[index];
      if (step) placed(takeToPart(steps, index, part), step.key, `step-${step.key}`);
    },
    duplicate: (index) => {
      const next = duplicateStep(steps, index);
      const copy = next[index + 1];
      if (copy) placed(next, copy.key, `step-${copy.key}`);
    },
    remove: (index) => {
      const step = steps[index];
      if (!step) return;
      setRemoved({ step, index });
      focusNext.current = 'undo-remove';
      store(removeStep(steps, index));
    },
    undoRemove: () => {
      if (!removed) return;
      setRemoved(null);
      placed(putBack(steps, removed.index, removed.step), removed.step.key, `step-${removed.step.key}`);
    },
  };
};
