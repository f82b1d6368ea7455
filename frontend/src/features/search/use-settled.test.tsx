import { act, renderHook } from '@testing-library/react';
import { useSettled } from './use-settled';

const sameWord = (first: string, second: string): boolean => first.toLowerCase() === second.toLowerCase();

const settled = () => renderHook(() => useSettled<string>('4', sameWord)).result;

beforeEach(() => {
  jest.useFakeTimers();
});
afterEach(() => {
  jest.useRealTimers();
});

describe('a value that settles', () => {
  it('takes the first change after a rest at once', () => {
    const result = settled();
    act(() => result.current[1]('4k'));
    expect(result.current[0]).toBe('4k');
  });

  it('takes of a run only the last, as soon as it pauses', () => {
    const result = settled();
    act(() => result.current[1]('4k'));
    act(() => result.current[1]('4k7'));
    act(() => jest.advanceTimersByTime(20));
    act(() => result.current[1]('4k75'));
    act(() => jest.advanceTimersByTime(39));
    expect(result.current[0]).toBe('4k');
    act(() => jest.advanceTimersByTime(1));
    expect(result.current[0]).toBe('4k75');
  });

  it('takes a change at once again after the next rest', () => {
    const result = settled();
    act(() => result.current[1]('4k'));
    act(() => jest.advanceTimersByTime(121));
    act(() => result.current[1]('4k7'));
    expect(result.current[0]).toBe('4k7');
  });

  it('passes over what asks for nothing new, and does not lose what is still to come', () => {
    const result = settled();
    act(() => result.current[1]('4k'));
    act(() => result.current[1]('4k7'));
    act(() => result.current[1]('4K7'));
    act(() => jest.advanceTimersByTime(40));
    expect(result.current[0]).toBe('4k7');
  });
});
