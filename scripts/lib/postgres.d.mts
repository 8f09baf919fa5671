export type Cluster = {
  /** As the owner of the tables; a superuser of this cluster, so it may create databases. */
  url: string;
  /** As the application's own role, `upstand_app`. */
  appUrl: string;
  appPassword: string;
  port: number;
  /** Where it really lies. */
  folder: string;
  pid: number | undefined;
  ended: Promise<void>;
  failure: () => Error | null;
  stop: () => Promise<void>;
};
export function startPostgres(options: {
  dir: string;
  /** A free port of the system's choice when left out. */
  port?: number;
  durable?: boolean;
  passwords?: { owner: string; app: string };
  log?: (note: string) => void;
}): Promise<Cluster>;
export function newPasswords(): { owner: string; app: string };
