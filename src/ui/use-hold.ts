import { useEffect, useEffectEvent, useRef, useState } from 'react';
import type { KeyboardEvent, MouseEvent, PointerEvent } from 'react';

/** How far a press-and-hold has come. */
export type HoldPhase = 'idle' | 'holding' | 'held';

const isHoldKey = (key: string): boolean => key === ' ' || key === 'Enter';

/**
 * Press-and-hold by pointer or by Space or Enter: `onHeld` runs once after `holdMs` without a break. Letting go,
 * sliding off, losing the focus or the pointer before then does nothing.
 */
export const useHold = (onHeld: () => void, holdMs: number, disabled: boolean) => {
  const [phase, setPhase] = useState<HoldPhase>('idle');
  const pointer = useRef<number | null>(null);
  if (disabled && phase !== 'idle') setPhase('idle');

  const complete = useEffectEvent(() => {
    setPhase('held');
    onHeld();
  });
  useEffect(() => {
    if (phase !== 'holding') return;
    const timer = window.setTimeout(() => complete(), holdMs);
    return () => window.clearTimeout(timer);
  }, [phase, holdMs]);

  const start = (): void => {
    if (!disabled) setPhase('holding');
  };
  const release = (): void => {
    pointer.current = null;
    setPhase('idle');
  };
  const releasePointer = (event: PointerEvent<HTMLElement>): void => {
    if (event.pointerId === pointer.current) release();
  };

  const handlers = {
    onPointerDown: (event: PointerEvent<HTMLElement>): void => {
      if (event.button !== 0 || pointer.current !== null) return;
      // Touch captures the pointer by itself, and then sliding off would never be noticed.
      const { currentTarget, pointerId } = event;
      if (currentTarget.hasPointerCapture?.(pointerId)) currentTarget.releasePointerCapture(pointerId);
      pointer.current = pointerId;
      start();
    },
    onPointerUp: releasePointer,
    onPointerLeave: releasePointer,
    onPointerCancel: releasePointer,
    onBlur: release,
    onKeyDown: (event: KeyboardEvent<HTMLElement>): void => {
      if (!isHoldKey(event.key)) return;
      event.preventDefault();
      if (!event.repeat) start();
    },
    onKeyUp: (event: KeyboardEvent<HTMLElement>): void => {
      if (isHoldKey(event.key)) release();
    },
    onContextMenu: (event: MouseEvent<HTMLElement>): void => event.preventDefault(),
  };
  return { phase, handlers, release } as const;
};
