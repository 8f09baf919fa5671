// Loaded into the server's process beside it: says at its end how long its event loop was held up at most, and its heap.
import { monitorEventLoopDelay } from 'node:perf_hooks';

const delay = monitorEventLoopDelay({ resolution: 5 });
delay.enable();
process.on('SIGUSR2', () => {
  const ms = (ns) => (ns / 1e6).toFixed(0);
  console.log(
    `  event loop of the server: p50 ${ms(delay.percentile(50))}, p99 ${ms(delay.percentile(99))}, most ${ms(delay.max)} ms`,
  );
  delay.reset();
});
