/** For tests; the start scripts themselves are plain JavaScript. */
export interface DatabaseServer {
  readonly port: number;
  readonly pid: number;
  /** By account: `root` names no database, the others do. */
  readonly urls: { readonly root: string; readonly migrations: string; readonly server: string };
  readonly grantTo: string;
  readonly lost: Promise<void>;
  stop(): Promise<void>;
}

export function openDatabaseServer(folder: string, options?: { isThrowAway?: boolean }): Promise<DatabaseServer>;
