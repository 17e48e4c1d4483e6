import { cx } from './cx.ts';

/** One step of the work, a bud on the tree. */
export interface TreeStep {
  readonly key: string;
  readonly label: string;
  readonly state: 'done' | 'current' | 'todo';
}

/** Props of {@link CastingTree}. */
export interface CastingTreeProps {
  /** The steps in the order they are done, from the foot of the tree up. */
  readonly steps: readonly TreeStep[];
  readonly className?: string;
}

const left = -13;
const width = 156;
const height = 540;
const trunkX = 65;
const footY = 516;
const tipY = 30;

const stateWords: Readonly<Record<TreeStep['state'], string>> = {
  done: 'done',
  current: 'now',
  todo: 'to come',
};

// A wax pattern sits on its sprue by the narrow end, leaning upward.
const budPath = 'M0 0 C7 -9 17 -14 17 -27 A17 17 0 0 0 -17 -27 C-17 -14 -7 -9 0 0 Z';

const budLooks: Readonly<Record<TreeStep['state'], string>> = {
  done: 'fill-brass-fill stroke-ink',
  current: 'fill-ember-fill stroke-ember-fill',
  todo: 'fill-ground stroke-ink',
};

interface BudProps {
  readonly state: TreeStep['state'];
  readonly y: number;
  readonly side: 1 | -1;
}

const Bud = ({ state, y, side }: BudProps) => {
  const scale = state === 'current' ? 1.14 : 1;
  const place = `translate(${trunkX + side * 17} ${y - 2}) rotate(${side * 58}) scale(${scale})`;
  return (
    <g data-part="bud" data-state={state}>
      {state === 'current' ? (
        <path
          d={budPath}
          transform={place}
          className="fill-none stroke-ember-soft"
          strokeWidth="16"
          strokeLinejoin="round"
        />
      ) : null}
      <path
        d={`M${trunkX} ${y + 16} q0 -16 ${side * 18} -19`}
        fill="none"
        className="stroke-ink"
        strokeWidth="7"
        strokeLinecap="round"
      />
      <path
        d={budPath}
        transform={place}
        className={budLooks[state]}
        strokeWidth="5.5"
        strokeLinejoin="round"
      />
    </g>
  );
};

/**
 * Progress as a casting tree: a trunk with a bud for each step, filled from the foot up as steps are done; the current
 * one is larger, ember and named below the tree. Screen readers hear an ordered list.
 */
export const CastingTree = ({ steps, className }: CastingTreeProps) => {
  const gap = (footY - tipY - 40) / Math.max(1, steps.length);
  const current = steps.findIndex((step) => step.state === 'current');
  return (
    <div className={cx('w-[132px]', className)}>
      <svg viewBox={`${left} 0 ${width} ${height}`} className="w-full" aria-hidden="true">
        <path
          d={`M${trunkX} ${footY} V${tipY}`}
          className="stroke-ink"
          strokeWidth="8"
          strokeLinecap="round"
        />
        {steps.map((step, index) => (
          <Bud
            key={step.key}
            state={step.state}
            y={footY - 34 - index * gap}
            side={index % 2 === 0 ? 1 : -1}
          />
        ))}
        <path
          d={`M${trunkX - 36} ${footY + 12} q4 -14 22 -16 h28 q18 2 22 16z`}
          className="fill-ink stroke-ink"
          strokeWidth="5"
          strokeLinejoin="round"
        />
      </svg>
      <ol aria-label="Steps" className="sr-only">
        {steps.map((step) => (
          <li key={step.key} aria-current={step.state === 'current' ? 'step' : undefined}>
            {step.label}, {stateWords[step.state]}
          </li>
        ))}
      </ol>
      {current === -1 ? null : (
        <p className="mt-1 text-center leading-tight" aria-hidden="true">
          <span className="block text-[23px] font-black">{steps[current]?.label}</span>
          <span className="text-[20px] text-soft">
            {current + 1} of {steps.length}
          </span>
        </p>
      )}
    </div>
  );
};
