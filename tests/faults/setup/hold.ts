/** A place where what a process does is held up until the test lets it go on. */
export type Hold = {
  /** Resolves when the process is there. */
  readonly reached: Promise<void>;
  letGo(): void;
};

/** The two ends of a hold: the test's, and the proxy's that stands there and waits. */
export function makeHold(): { hold: Hold; stand: () => Promise<void> } {
  let arrive = (): void => undefined;
  let open = (): void => undefined;
  const reached = new Promise<void>((resolve) => (arrive = resolve));
  const opened = new Promise<void>((resolve) => (open = resolve));
  return {
    hold: { reached, letGo: () => open() },
    stand: () => {
      arrive();
      return opened;
    },
  };
}
