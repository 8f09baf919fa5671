type Lock = {
  packages: Record<string, { version?: string; optional?: boolean; devOptional?: boolean; link?: boolean }>;
};
export function ensureNodePackages(root: string): Promise<boolean>;
export function isInstalled(wanted: Lock, installed: Lock | null): boolean;
