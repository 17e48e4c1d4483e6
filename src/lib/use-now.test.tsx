import { act, renderHook } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { useNow } from './use-now.ts';

beforeEach(() => vi.useFakeTimers({ now: 1_000_000 }));
afterEach(() => vi.useRealTimers());

describe('useNow', () => {
  it('moves on with the clock', () => {
    const { result } = renderHook(() => useNow(250));
    expect(result.current).toBe(1_000_000);
    act(() => {
      vi.advanceTimersByTime(1000);
    });
    expect(result.current).toBe(1_001_000);
  });

  it('catches up at once when the page is seen again', () => {
    const { result } = renderHook(() => useNow(60_000));
    vi.setSystemTime(1_030_000);
    act(() => {
      document.dispatchEvent(new Event('visibilitychange'));
    });
    expect(result.current).toBe(1_030_000);
  });

  it('stands still when told to', () => {
    const { result } = renderHook(() => useNow(250, false));
    act(() => {
      vi.advanceTimersByTime(5000);
    });
    expect(result.current).toBe(1_000_000);
  });
});
