export interface ProductOptions {
  adminUrl: string;
  dataDir: string;
  databaseName?: string;
  port?: number;
  seedDemo?: boolean;
  env?: Record<string, string>;
}

export interface Product {
  origin: string;
  port: number;
  dataDir: string;
  photoDir: string;
  databaseUrl: string;
  adminDatabaseUrl: string;
  migratorDatabaseUrl: string;
  accounts: { role: string; name: string; email: string; password: string }[];
  onDeath: ((how: number | string | null) => void) | null;
  readonly apiPid: number | null;
  startApi(): Promise<void>;
  stopApi(): Promise<void>;
  killApi(): Promise<void>;
  discard(): Promise<void>;
}

export function startProduct(options: ProductOptions): Promise<Product>;
