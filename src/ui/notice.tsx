import type { ReactNode } from 'react';
import { cx } from './cx.ts';
import { StateMark } from './state-mark.tsx';

/** Props of {@link Notice}. */
export interface NoticeProps {
  /** `empty` for a place with nothing in it yet, `error` for what failed, `caution` and `info` for the rest. */
  readonly kind: 'empty' | 'error' | 'caution' | 'info';
  /** What is so, in one sentence. */
  readonly title: string;
  /** What to do next. */
  readonly children?: ReactNode;
  /** A button or link that does it. */
  readonly action?: ReactNode;
  readonly size?: 'desk' | 'terminal';
}

const boxes = {
  empty: 'border-dashed border-soft bg-transparent',
  error: 'border-ember border-[3px] bg-panel',
  caution: 'border-ink bg-panel',
  info: 'border-line bg-panel',
} as const;

const states = { error: 'stop', caution: 'caution' } as const;

/** A message in place: what is so and what to do next; errors are announced at once, the rest in turn. */
export const Notice = ({ kind, title, children, action, size = 'desk' }: NoticeProps) => {
  const isTerminal = size === 'terminal';
  const isMarked = kind === 'error' || kind === 'caution';
  return (
    <div
      role={kind === 'error' ? 'alert' : kind === 'empty' ? undefined : 'status'}
      className={cx(
        'grid border-2',
        boxes[kind],
        isTerminal ? 'gap-4 rounded-[26px] px-8 py-6 text-2xl' : 'gap-2 rounded-[18px] px-5 py-4',
      )}
    >
      {isMarked ? (
        <StateMark state={states[kind]} text={title} size={size} />
      ) : (
        <p className={cx('font-black', isTerminal ? 'text-[32px] leading-tight' : 'text-lg')}>{title}</p>
      )}
      {children ? <div className="text-soft">{children}</div> : null}
      {action ? <div className="mt-1 flex flex-wrap gap-4">{action}</div> : null}
    </div>
  );
};
