import { cpus, totalmem } from 'node:os';

/** What the figures were measured on, for the head of a bench's report. */
export const machine = (): string => {
  const cores = cpus();
  const memory = Math.round(totalmem() / 1024 ** 3);
  return `${cores.length} × ${cores[0]?.model.trim() ?? 'unknown processor'}, ${memory} GB, Node.js ${process.version}`;
};
