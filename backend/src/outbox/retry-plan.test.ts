import { waitAfter } from './retry-plan';

describe('the plan of retries', () => {
  it('waits four times longer each time, an hour at most, and gives up after the twelfth attempt', () => {
    const waits = Array.from({ length: 12 }, (_, index) => waitAfter(index + 1));
    // 5 s · 4^n: 5, 20, 80, 320, 1280, then 5120 s is more than an hour.
    expect(waits).toEqual([5, 20, 80, 320, 1280, 3600, 3600, 3600, 3600, 3600, 3600, undefined]);
  });
});
