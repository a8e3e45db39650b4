import { act, renderHook } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';

import { usePendingCells } from './usePendingCells.ts';

afterEach(() => vi.useRealTimers());

it('says saving at once, not saved after two seconds, and nothing once there is an answer', () => {
  vi.useFakeTimers();
  const { result } = renderHook(() => usePendingCells());
  let answered: () => void = () => undefined;
  act(() => {
    answered = result.current.begin([{ rowId: 'a', columnId: 'x' }]);
  });
  expect(result.current.rows.get('a')?.get('x')).toBe('saving');
  act(() => vi.advanceTimersByTime(1_900));
  expect(result.current.rows.get('a')?.get('x')).toBe('saving');
  act(() => vi.advanceTimersByTime(200));
  expect(result.current.rows.get('a')?.get('x')).toBe('not saved');
  act(() => answered());
  expect(result.current.rows.size).toBe(0);
});

it('keeps no timer for an edit that was answered in time', () => {
  vi.useFakeTimers();
  const { result, unmount } = renderHook(() => usePendingCells());
  act(() => result.current.begin([{ rowId: 'a', columnId: 'x' }])());
  expect(vi.getTimerCount()).toBe(0);
  act(() => {
    result.current.begin([{ rowId: 'b', columnId: 'x' }]);
  });
  unmount();
  expect(vi.getTimerCount()).toBe(0);
});
