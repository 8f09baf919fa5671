/**
 * Runs one step and prints its name with the time it took. What `say` is given stands behind the time.
 * @template T
 * @param {string} title
 * @param {(say: (note: string) => void) => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(title, work) {
  const began = performance.now();
  let note = '';
  try {
    const result = await work((text) => (note = text));
    print('  ', title, began, note);
    return result;
  } catch (error) {
    print('✗ ', title, began, 'failed');
    throw error;
  }
}

function print(mark, title, began, note) {
  const seconds = (performance.now() - began) / 1000;
  console.log(`${mark}${title.padEnd(30)} ${formatSeconds(seconds).padStart(9)}${note ? `   ${note}` : ''}`);
}

/** Seconds as a person reads them: `0.4 s`, `12 s`, `3 min 05 s`. */
export function formatSeconds(seconds) {
  if (seconds < 9.95) return `${seconds.toFixed(1)} s`;
  const whole = Math.round(seconds);
  if (whole < 120) return `${whole} s`;
  return `${Math.floor(whole / 60)} min ${String(whole % 60).padStart(2, '0')} s`;
}
