type Secrets = {
  database: { owner: string; app: string };
  storageKey: string;
  demoPassword: string;
};
export function readSecrets(dir: string): Secrets;
export function newDemoPassword(): string;
