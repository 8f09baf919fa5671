export type Environment = Readonly<Record<string, string | undefined>>;

/** Reads settings one by one and collects what is wrong with them; after a fault it hands out a harmless value. */
export function createReader(env: Environment) {
  const faults: string[] = [];
  // A setting that is there but empty is not given: that is how shells and container files leave one out.
  const given = (name: string): string | null => env[name]?.trim() || null;

  return {
    faults,
    text: (name: string, fallback: string): string => given(name) ?? fallback,
    required(name: string, { remedy }: { remedy: string }): string {
      const text = given(name);
      if (text === null) faults.push(`${name} is not set: ${remedy}.`);
      return text ?? '';
    },
    integer(
      name: string,
      { fallback, least, most }: { fallback: number; least: number; most: number },
    ): number {
      const text = given(name);
      if (text === null) return fallback;
      const value = /^\d{1,9}$/.test(text) ? Number(text) : Number.NaN;
      if (value >= least && value <= most) return value;
      faults.push(`${name} must be a whole number from ${least} to ${most}; it is “${text}”.`);
      return fallback;
    },
    flag(name: string, fallback: boolean): boolean {
      const text = given(name)?.toLowerCase();
      if (text === undefined || text === '') return fallback;
      if (['1', 'true', 'yes', 'on'].includes(text)) return true;
      if (['0', 'false', 'no', 'off'].includes(text)) return false;
      faults.push(`${name} must be 1 or 0; it is “${text}”.`);
      return fallback;
    },
    choice<const T extends string>(name: string, allowed: readonly T[], fallback: T): T {
      const text = given(name);
      if (text === null) return fallback;
      const found = allowed.find((choice) => choice === text);
      if (!found) faults.push(`${name} must be one of ${allowed.join(', ')}; it is “${text}”.`);
      return found ?? fallback;
    },
    url(name: string, options: { fallback?: string; protocols: readonly string[]; remedy?: string }): string {
      const text = given(name) ?? options.fallback ?? null;
      if (text === null) {
        faults.push(`${name} is not set: ${options.remedy ?? 'it has no default'}.`);
        return '';
      }
      if (text === '') return '';
      if (URL.canParse(text) && options.protocols.includes(new URL(text).protocol)) return text;
      // The address may hold a password: say what is expected, not what was given.
      faults.push(`${name} must be an address that begins with ${options.protocols.join(' or ')}`);
      return '';
    },
  };
}
