export type StartSettings = {
  port: number;
  url: string;
  dataDir: string;
  databaseUrl: string | null;
  storage: string | null;
  smtpUrl: string | null;
};
export function readStartSettings(env: Record<string, string | undefined>, root: string): StartSettings;
