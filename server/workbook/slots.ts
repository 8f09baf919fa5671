/** Lets at most `size` tasks run at once; the others wait in the order they came. */
export function createSlots(size: number): <T>(task: () => Promise<T>) => Promise<T> {
  let free = size;
  const waiting: (() => void)[] = [];
  return async (task) => {
    if (free > 0) free--;
    else await new Promise<void>((resolve) => waiting.push(resolve));
    try {
      return await task();
    } finally {
      const next = waiting.shift();
      if (next) next();
      else free++;
    }
  };
}
