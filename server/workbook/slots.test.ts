import { expect, it } from 'vitest';
import { createSlots } from './slots.ts';

it('lets no more than its number run at once, failures included, and serves in order', async () => {
  const inSlot = createSlots(2);
  let running = 0;
  let most = 0;
  const order: number[] = [];
  const task = (index: number) => async () => {
    most = Math.max(most, ++running);
    order.push(index);
    await new Promise((resolve) => setImmediate(resolve));
    running--;
    if (index === 1) throw new Error('one');
    return index;
  };
  const results = await Promise.allSettled([0, 1, 2, 3, 4].map((index) => inSlot(task(index))));
  expect(most).toBe(2);
  expect(order).toEqual([0, 1, 2, 3, 4]);
  expect(results.map((one) => one.status)).toEqual([
    'fulfilled',
    'rejected',
    'fulfilled',
    'fulfilled',
    'fulfilled',
  ]);
});
