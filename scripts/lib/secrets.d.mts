type Secrets = {
  database: { owner: string; app: string };
  storageKey: string;
  sessionSecret: string;
  demoPassword: string;
};
export function readSecrets(dir: string): Secrets;
export function newDemoPassword(): string;
