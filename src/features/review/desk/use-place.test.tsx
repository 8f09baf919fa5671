import { act, renderHook } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { expect, it } from 'vitest';
import { usePlace } from './use-place.ts';

const desk = () => renderHook(() => usePlace(), { wrapper: MemoryRouter });

it('keeps a line that was clicked before the first one was named', () => {
  const { result } = desk();
  act(() => {
    result.current.setLine('clicked');
    result.current.nameLine('first');
  });
  expect(result.current.line).toBe('clicked');
});

it('names a line where none was chosen, and again once the choice stands in the address', () => {
  const { result } = desk();
  act(() => result.current.nameLine('first'));
  expect(result.current.line).toBe('first');
  act(() => result.current.setLine('gone'));
  act(() => result.current.nameLine('next'));
  expect(result.current.line).toBe('next');
});
