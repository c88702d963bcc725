export interface Cluster {
  readonly folder: string;
  readonly port: number;
  readonly password: string;
  readonly started: boolean;
  readonly stop: () => void;
}
export function ensurePostgres(): void;
export function clusterFolder(dataFolder: string): string;
export function startCluster(options: { folder: string; passwordFile: string; throwaway?: boolean }): Promise<Cluster>;
export function stopCluster(folder: string): void;
export function serverUrl(user: string, password: string, port: number, database: string): string;
export function ensureDatabase(options: {
  port: number;
  password: string;
  database: string;
  ownerPassword: string;
  appPassword: string;
}): Promise<void>;
