import type { Plugin } from 'vite';

export function initialBudget(options?: { mostKb?: number }): Plugin;
