/** The types of throw-away.mjs, for tests written in TypeScript. */
export interface ThrowAwayCluster {
  port: number;
  folder: string;
  stateFolder: string;
  ownerUrl: string;
  appUrl: string;
  authUrl: string;
  superuserUrl: string;
  stop(): Promise<void>;
  serverPid(): number | null;
  remove(): Promise<void>;
}

export function throwAwayCluster(options?: { durable?: boolean }): Promise<ThrowAwayCluster>;
