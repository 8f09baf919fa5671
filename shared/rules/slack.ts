/** Comparisons allow for the last digits of binary arithmetic: 1e-9 in whatever unit is compared. */
const SLACK = 1e-9;

export const atLeast = (measured: number, limit: number): boolean => measured >= limit - SLACK;
export const atMost = (measured: number, limit: number): boolean => measured <= limit + SLACK;
